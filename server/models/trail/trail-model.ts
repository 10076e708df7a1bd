import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type ModelStatic,
  type Sequelize,
} from 'sequelize';
import { key, optionalText, text } from '../columns';

/**
 * An entry of the trail; append-only. `chain` is a study's id, or `site`; `before` and `after` are
 * JSON or null; `mac` covers the entry and `previousMac`, the mac of the entry before it.
 */
export interface TrailModel extends Model<
  InferAttributes<TrailModel>,
  InferCreationAttributes<TrailModel>
> {
  chain: string;
  number: number;
  at: string;
  personId: string | null;
  what: string;
  before: string | null;
  after: string | null;
  previousMac: string;
  mac: string;
}

/** Binds the table of the trail to a database. */
export function defineTrail(sequelize: Sequelize): ModelStatic<TrailModel> {
  return sequelize.define<TrailModel>('trail', {
    chain: key(),
    number: key(DataTypes.INTEGER),
    at: text(),
    personId: optionalText(),
    what: text(),
    before: optionalText(),
    after: optionalText(),
    previousMac: text(),
    mac: text(),
  });
}
