import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, optionalText, text, whole } from '../columns';

/** An outcome of a study: the words for it. The id comes from the client and counts per study. */
export interface OutcomeModel extends Model<
  InferAttributes<OutcomeModel>,
  InferCreationAttributes<OutcomeModel>
> {
  studyId: string;
  id: string;
  position: number;
  noun: string;
  verbPhrase: string;
  timeFrame: string | null;
  desirability: 'harmful' | 'beneficial';
}

/** Binds the table of outcomes to a database. */
export function defineOutcomes(sequelize: Sequelize): ModelStatic<OutcomeModel> {
  return sequelize.define<OutcomeModel>('outcomes', {
    studyId: key(),
    id: key(),
    position: whole(),
    noun: text(),
    verbPhrase: text(),
    timeFrame: optionalText(),
    desirability: text(),
  });
}
