import type { ModelStatic, Sequelize } from 'sequelize';
import { within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineSiteSettings, type SiteSettingModel } from './site-setting-model';

/** Reads and writes the settings of the installation; the values are JSON. */
export class SiteSettingStore {
  private readonly settings: ModelStatic<SiteSettingModel>;

  constructor(sequelize: Sequelize) {
    this.settings = defineSiteSettings(sequelize);
  }

  /** The value of a setting, or null when it was never set. */
  async find(name: string, unit?: Unit): Promise<unknown> {
    const row = await this.settings.findByPk(name, within(unit));
    return row === null ? null : JSON.parse(row.content);
  }

  async put(name: string, value: unknown, unit: Unit): Promise<void> {
    await this.settings.upsert({ name, content: JSON.stringify(value) }, within(unit));
  }
}
