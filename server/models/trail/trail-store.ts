import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import { plain, plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineTrail, type TrailModel } from './trail-model';

/** An entry of the trail as stored. */
export type TrailEntry = Readonly<InferAttributes<TrailModel>>;

/** Reads the trail and appends to it. */
export class TrailStore {
  private readonly trail: ModelStatic<TrailModel>;

  constructor(sequelize: Sequelize) {
    this.trail = defineTrail(sequelize);
  }

  /** The newest entry of a chain, or null for an empty chain. */
  async head(chain: string, unit?: Unit): Promise<TrailEntry | null> {
    const order: [string, string][] = [['number', 'DESC']];
    return plainOrNull(await this.trail.findOne({ where: { chain }, order, ...within(unit) }));
  }

  /** All entries of a chain, oldest first. */
  async list(chain: string): Promise<readonly TrailEntry[]> {
    const order: [string, string][] = [['number', 'ASC']];
    return (await this.trail.findAll({ where: { chain }, order })).map(plain);
  }

  async append(entry: TrailEntry, unit: Unit): Promise<void> {
    await this.trail.create(entry, within(unit));
  }
}
