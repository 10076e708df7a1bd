import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import type { StudyRole } from '#shared/permissions';
import { key, text } from '../columns';

/** The one role of a person on a study. */
export interface MembershipModel extends Model<
  InferAttributes<MembershipModel>,
  InferCreationAttributes<MembershipModel>
> {
  studyId: string;
  userId: string;
  role: StudyRole;
  createdAt: string;
}

/** Binds the table of memberships to a database. */
export function defineMemberships(sequelize: Sequelize): ModelStatic<MembershipModel> {
  return sequelize.define<MembershipModel>('memberships', {
    studyId: key(),
    userId: key(),
    role: text(),
    createdAt: text(),
  });
}
