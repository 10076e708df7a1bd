import { QueryTypes, type InferAttributes, type ModelStatic, type Sequelize } from 'sequelize';
import type { AnalysisResult } from '#shared/analysis';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineResults, type ResultModel } from './result-model';

type Row = InferAttributes<ResultModel>;

/** A stored result. */
export type StoredResult = Readonly<Omit<Row, 'content'>> & { readonly content: AnalysisResult };

/** What a result is kept under: the same key gives the same numbers. */
export type ResultKey = Pick<
  StoredResult,
  'analysisId' | 'analysisVersion' | 'cutId' | 'codeBookId' | 'engineVersion'
>;

/** Reads results and adds new ones; a result never changes. */
export class ResultStore {
  private readonly results: ModelStatic<ResultModel>;

  constructor(private readonly sequelize: Sequelize) {
    this.results = defineResults(sequelize);
  }

  async findById(id: string, unit?: Unit): Promise<StoredResult | null> {
    return parse(await this.results.findByPk(id, within(unit)));
  }

  async findMany(ids: readonly string[], unit?: Unit): Promise<readonly StoredResult[]> {
    const rows = await this.results.findAll({ where: { id: [...ids] }, ...within(unit) });
    return rows.flatMap((row) => parse(row) ?? []);
  }

  async findByKey(key: ResultKey, unit?: Unit): Promise<StoredResult | null> {
    const { analysisId, analysisVersion, cutId, codeBookId, engineVersion } = key;
    const where = { analysisId, analysisVersion, cutId, codeBookId, engineVersion };
    return parse(await this.results.findOne({ where, ...within(unit) }));
  }

  /** Id of the newest result of an analysis: by version, then by code book; null for none. */
  async newestId(analysisId: string, unit?: Unit): Promise<string | null> {
    const rows = await this.sequelize.query<{ id: string }>(
      `SELECT results.id AS id
       FROM results JOIN code_books ON code_books.id = results.code_book_id
       WHERE results.analysis_id = :analysisId
       ORDER BY results.analysis_version DESC, code_books.number DESC, results.created_at DESC
       LIMIT 1`,
      { type: QueryTypes.SELECT, replacements: { analysisId }, ...within(unit) },
    );
    return rows[0]?.id ?? null;
  }

  async insert(result: StoredResult, unit: Unit): Promise<void> {
    const content = JSON.stringify(result.content);
    await this.results.create({ ...result, content }, within(unit));
  }
}

function parse(instance: ResultModel | null): StoredResult | null {
  if (instance === null) return null;
  const row = plain(instance);
  return { ...row, content: JSON.parse(row.content) as AnalysisResult };
}
