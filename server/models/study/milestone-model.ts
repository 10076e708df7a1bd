import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, text } from '../columns';

/** A milestone of a study; `dueDate` is a calendar date (YYYY-MM-DD). */
export interface MilestoneModel extends Model<
  InferAttributes<MilestoneModel>,
  InferCreationAttributes<MilestoneModel>
> {
  studyId: string;
  id: string;
  title: string;
  dueDate: string;
}

/** Binds the table of milestones to a database. */
export function defineMilestones(sequelize: Sequelize): ModelStatic<MilestoneModel> {
  return sequelize.define<MilestoneModel>('milestones', {
    studyId: key(),
    id: key(),
    title: text(),
    dueDate: text(),
  });
}
