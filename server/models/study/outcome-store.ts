import { QueryTypes, type InferAttributes, type ModelStatic, type Sequelize } from 'sequelize';
import type { AnalysisSpecification } from '#shared/analysis';
import { plain, plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineOutcomes, type OutcomeModel } from './outcome-model';

/** An outcome as stored. */
export type Outcome = Readonly<InferAttributes<OutcomeModel>>;

/** Reads and writes the outcomes of studies. */
export class OutcomeStore {
  private readonly outcomes: ModelStatic<OutcomeModel>;

  constructor(private readonly sequelize: Sequelize) {
    this.outcomes = defineOutcomes(sequelize);
  }

  /** The outcomes of a study, in order. */
  async list(studyId: string, unit?: Unit): Promise<readonly Outcome[]> {
    const order: [string, string][] = [
      ['position', 'ASC'],
      ['id', 'ASC'],
    ];
    return (await this.outcomes.findAll({ where: { studyId }, order, ...within(unit) })).map(plain);
  }

  async find(studyId: string, id: string, unit?: Unit): Promise<Outcome | null> {
    return plainOrNull(await this.outcomes.findOne({ where: { studyId, id }, ...within(unit) }));
  }

  /** The names of the analyses whose present version counts this outcome. */
  async analysesThatUse(studyId: string, id: string, unit?: Unit): Promise<readonly string[]> {
    const rows = await this.sequelize.query<{ name: string; specification: string }>(
      `SELECT analyses.name AS name, analysis_versions.specification AS specification
       FROM analyses JOIN analysis_versions
         ON analysis_versions.analysis_id = analyses.id
         AND analysis_versions.number = analyses.version
       WHERE analyses.removed_at IS NULL AND analyses.study_id = :studyId`,
      { type: QueryTypes.SELECT, replacements: { studyId }, ...within(unit) },
    );
    return rows
      .filter(({ specification }) => usesOutcome(specification, id))
      .map(({ name }) => name);
  }

  /** Inserts the outcome or replaces its words. */
  async put(outcome: Outcome, unit: Unit): Promise<void> {
    await this.outcomes.upsert(outcome, within(unit));
  }

  async remove(studyId: string, id: string, unit: Unit): Promise<void> {
    await this.outcomes.destroy({ where: { studyId, id }, ...within(unit) });
  }
}

function usesOutcome(specification: string, outcomeId: string): boolean {
  return (JSON.parse(specification) as AnalysisSpecification).outcome.outcomeId === outcomeId;
}
