import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import type { StudyDesign } from '#shared/effects';
import { flag, key, text } from '../columns';

/** A study. `invented` marks demonstration data. */
export interface StudyModel extends Model<
  InferAttributes<StudyModel>,
  InferCreationAttributes<StudyModel>
> {
  id: string;
  title: string;
  design: StudyDesign;
  population: string;
  peopleNoun: string;
  invented: boolean;
  createdAt: string;
  updatedAt: string;
}

/** Binds the table of studies to a database. */
export function defineStudies(sequelize: Sequelize): ModelStatic<StudyModel> {
  return sequelize.define<StudyModel>('studies', {
    id: key(),
    title: text(),
    design: text(),
    population: text(),
    peopleNoun: text(),
    invented: flag(),
    createdAt: text(),
    updatedAt: text(),
  });
}
