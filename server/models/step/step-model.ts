import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, optionalText, text, whole } from '../columns';

/** An accepted step of a report; immutable. `forward` and `inverse` are JSON steps. */
export interface StepModel extends Model<
  InferAttributes<StepModel>,
  InferCreationAttributes<StepModel>
> {
  reportId: string;
  /** Made by the client; a repeated one is applied once. */
  id: string;
  seq: number;
  groupId: string;
  undoes: string | null;
  forward: string;
  inverse: string;
  personId: string;
  at: string;
}

/** Binds the table of steps to a database. */
export function defineSteps(sequelize: Sequelize): ModelStatic<StepModel> {
  return sequelize.define<StepModel>('steps', {
    reportId: key(),
    id: key(),
    seq: whole(),
    groupId: text(),
    undoes: optionalText(),
    forward: text(),
    inverse: text(),
    personId: text(),
    at: text(),
  });
}
