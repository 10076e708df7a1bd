import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import { plain, plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineOutcomes, type OutcomeModel } from './outcome-model';

/** An outcome as stored. */
export type Outcome = Readonly<InferAttributes<OutcomeModel>>;

/** Reads and writes the outcomes of studies. */
export class OutcomeStore {
  private readonly outcomes: ModelStatic<OutcomeModel>;

  constructor(sequelize: Sequelize) {
    this.outcomes = defineOutcomes(sequelize);
  }

  /** The outcomes of a study, in order. */
  async list(studyId: string, unit?: Unit): Promise<readonly Outcome[]> {
    const order: [string, string][] = [['position', 'ASC'], ['id', 'ASC']];
    return (await this.outcomes.findAll({ where: { studyId }, order, ...within(unit) })).map(plain);
  }

  async find(studyId: string, id: string, unit?: Unit): Promise<Outcome | null> {
    return plainOrNull(await this.outcomes.findOne({ where: { studyId, id }, ...within(unit) }));
  }

  /** Inserts the outcome or replaces its words. */
  async put(outcome: Outcome, unit: Unit): Promise<void> {
    await this.outcomes.upsert(outcome, within(unit));
  }

  async remove(studyId: string, id: string, unit: Unit): Promise<void> {
    await this.outcomes.destroy({ where: { studyId, id }, ...within(unit) });
  }
}
