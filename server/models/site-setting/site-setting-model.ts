import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, text } from '../columns';

/** A setting of the whole installation; `content` is JSON. */
export interface SiteSettingModel extends Model<
  InferAttributes<SiteSettingModel>,
  InferCreationAttributes<SiteSettingModel>
> {
  name: string;
  content: string;
}

/** Binds the table of site settings to a database. */
export function defineSiteSettings(sequelize: Sequelize): ModelStatic<SiteSettingModel> {
  return sequelize.define<SiteSettingModel>('site_settings', { name: key(), content: text() });
}
