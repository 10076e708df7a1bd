import { QueryTypes, type Sequelize } from 'sequelize';
import { within } from '../rows';
import type { Unit } from '../unit-of-work';

/** What an analysis says about the cut that it counts. */
export interface CutFacts {
  readonly id: string;
  readonly number: number;
  readonly dataDate: string;
  readonly dataSetId: string;
  readonly dataSetName: string;
}

const FACTS = `SELECT cuts.id AS id, cuts.number AS number, cuts.data_date AS dataDate,
    data_sets.id AS dataSetId, data_sets.name AS dataSetName
  FROM cuts JOIN data_sets ON data_sets.id = cuts.data_set_id`;

/** Reads where cuts belong: their data set, their number and their date. */
export class CutFactsStore {
  constructor(private readonly sequelize: Sequelize) {}

  /** A cut of this study whose records are there to be counted; another study's is not found. */
  async findReady(studyId: string, id: string, unit?: Unit): Promise<CutFacts | null> {
    const rows = await this.sequelize.query<CutFacts>(
      `${FACTS} WHERE cuts.id = :id AND data_sets.study_id = :studyId AND cuts.state = 'ready'`,
      { type: QueryTypes.SELECT, replacements: { studyId, id }, ...within(unit) },
    );
    return rows[0] ?? null;
  }

  /** Facts of these cuts by id, destroyed ones too. */
  async of(ids: readonly string[], unit?: Unit): Promise<ReadonlyMap<string, CutFacts>> {
    if (ids.length === 0) return new Map();
    const rows = await this.sequelize.query<CutFacts>(`${FACTS} WHERE cuts.id IN (:ids)`, {
      type: QueryTypes.SELECT,
      replacements: { ids: [...ids] },
      ...within(unit),
    });
    return new Map(rows.map((row) => [row.id, row]));
  }
}
