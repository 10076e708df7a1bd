import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import { plain, plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineMilestones, type MilestoneModel } from './milestone-model';

/** A milestone as stored. */
export type StoredMilestone = Readonly<InferAttributes<MilestoneModel>>;

/** Reads and writes the milestones of studies. */
export class MilestoneStore {
  private readonly milestones: ModelStatic<MilestoneModel>;

  constructor(sequelize: Sequelize) {
    this.milestones = defineMilestones(sequelize);
  }

  /** The milestones of a study, by due date. */
  async list(studyId: string, unit?: Unit): Promise<readonly StoredMilestone[]> {
    const order: [string, string][] = [
      ['dueDate', 'ASC'],
      ['id', 'ASC'],
    ];
    const rows = await this.milestones.findAll({ where: { studyId }, order, ...within(unit) });
    return rows.map(plain);
  }

  async find(studyId: string, id: string, unit?: Unit): Promise<StoredMilestone | null> {
    return plainOrNull(await this.milestones.findOne({ where: { studyId, id }, ...within(unit) }));
  }

  /** Inserts the milestone or replaces it. */
  async put(milestone: StoredMilestone, unit: Unit): Promise<void> {
    await this.milestones.upsert(milestone, within(unit));
  }

  async remove(studyId: string, id: string, unit: Unit): Promise<void> {
    await this.milestones.destroy({ where: { studyId, id }, ...within(unit) });
  }
}
