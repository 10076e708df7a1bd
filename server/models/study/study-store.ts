import { Op, type InferAttributes, type ModelStatic, type Sequelize } from 'sequelize';
import { plain, plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineStudies, type StudyModel } from './study-model';

/** A study as stored. */
export type Study = Readonly<InferAttributes<StudyModel>>;

/** What may change of a study. */
export type StudyChange = Partial<Omit<Study, 'id' | 'createdAt'>>;

/** Reads and writes studies. */
export class StudyStore {
  private readonly studies: ModelStatic<StudyModel>;

  constructor(sequelize: Sequelize) {
    this.studies = defineStudies(sequelize);
  }

  async findById(id: string, unit?: Unit): Promise<Study | null> {
    return plainOrNull(await this.studies.findByPk(id, within(unit)));
  }

  async findMany(ids: readonly string[], unit?: Unit): Promise<readonly Study[]> {
    const where = { id: { [Op.in]: [...ids] } };
    const order: [string, string][] = [
      ['updatedAt', 'DESC'],
      ['id', 'ASC'],
    ];
    return (await this.studies.findAll({ where, order, ...within(unit) })).map(plain);
  }

  async insert(study: Study, unit: Unit): Promise<void> {
    await this.studies.create(study, within(unit));
  }

  async update(id: string, change: StudyChange, unit: Unit): Promise<void> {
    await this.studies.update(change, { where: { id }, ...within(unit) });
  }
}
