import { QueryTypes, type InferAttributes, type ModelStatic, type Sequelize } from 'sequelize';
import type { AnalysisSpecification } from '#shared/analysis';
import { plain, plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineAnalyses, type AnalysisModel } from './analysis-model';
import { defineAnalysisVersions, type AnalysisVersionModel } from './analysis-version-model';

/** An analysis as stored. */
export type Analysis = Readonly<InferAttributes<AnalysisModel>>;

/** One version of an analysis. */
export type AnalysisVersion = Readonly<
  Omit<InferAttributes<AnalysisVersionModel>, 'specification'>
> & {
  readonly specification: AnalysisSpecification;
};

/** What may change of an analysis. */
export type AnalysisChange = Pick<Analysis, 'name' | 'version' | 'updatedAt'>;

const BY_NUMBER: [string, string][] = [['number', 'ASC']];

/** Reads and writes analyses; their versions are only added. */
export class AnalysisStore {
  private readonly analyses: ModelStatic<AnalysisModel>;
  private readonly versions: ModelStatic<AnalysisVersionModel>;

  constructor(private readonly sequelize: Sequelize) {
    this.analyses = defineAnalyses(sequelize);
    this.versions = defineAnalysisVersions(sequelize);
  }

  /** Finds an analysis of this study that was not removed. */
  async find(studyId: string, id: string, unit?: Unit): Promise<Analysis | null> {
    const where = { studyId, id, removedAt: null };
    return plainOrNull(await this.analyses.findOne({ where, ...within(unit) }));
  }

  /** The analyses of a study, by their numbers. */
  async list(studyId: string, unit?: Unit): Promise<readonly Analysis[]> {
    const where = { studyId, removedAt: null };
    const rows = await this.analyses.findAll({ where, order: BY_NUMBER, ...within(unit) });
    return rows.map(plain);
  }

  /** The analyses whose present version counts a cut of this data set, by their numbers. */
  async ofDataSet(dataSetId: string, unit?: Unit): Promise<readonly Analysis[]> {
    return this.sequelize.query<Analysis>(
      `SELECT analyses.id AS id, analyses.study_id AS studyId, analyses.number AS number,
         analyses.name AS name, analyses.version AS version, analyses.created_at AS createdAt,
         analyses.updated_at AS updatedAt, analyses.removed_at AS removedAt
       FROM analyses
         JOIN analysis_versions ON analysis_versions.analysis_id = analyses.id
           AND analysis_versions.number = analyses.version
         JOIN cuts ON cuts.id = analysis_versions.cut_id
       WHERE analyses.removed_at IS NULL AND cuts.data_set_id = :dataSetId
       ORDER BY analyses.number`,
      { type: QueryTypes.SELECT, replacements: { dataSetId }, ...within(unit) },
    );
  }

  /** The number of an analysis, also of a removed one. */
  async numberOf(id: string, unit?: Unit): Promise<number> {
    const row = await this.analyses.findByPk(id, within(unit));
    if (row === null) throw new Error(`Analysis ${id} is gone.`);
    return row.number;
  }

  /** The next free number; numbers of removed analyses are not given again. */
  async nextNumber(studyId: string, unit: Unit): Promise<number> {
    const highest = await this.analyses.max<number | null, AnalysisModel>('number', {
      where: { studyId },
      ...within(unit),
    });
    return (highest ?? 0) + 1;
  }

  async insert(analysis: Analysis, unit: Unit): Promise<void> {
    await this.analyses.create(analysis, within(unit));
  }

  /** Changes the analysis if it still has this version; says whether it had. */
  async update(id: string, version: number, change: AnalysisChange, unit: Unit): Promise<boolean> {
    const where = { id, version, removedAt: null };
    const [changed] = await this.analyses.update(change, { where, ...within(unit) });
    return changed === 1;
  }

  async remove(id: string, removedAt: string, unit: Unit): Promise<void> {
    await this.analyses.update({ removedAt }, { where: { id }, ...within(unit) });
  }

  /** One version; a version that an analysis names and that is not there is a bug. */
  async version(analysisId: string, number: number, unit?: Unit): Promise<AnalysisVersion> {
    const row = await this.versions.findOne({ where: { analysisId, number }, ...within(unit) });
    if (row === null) throw new Error(`Version ${String(number)} of ${analysisId} is gone.`);
    return parse(row);
  }

  /** All versions, oldest first. */
  async history(analysisId: string, unit?: Unit): Promise<readonly AnalysisVersion[]> {
    const where = { analysisId };
    const rows = await this.versions.findAll({ where, order: BY_NUMBER, ...within(unit) });
    return rows.map(parse);
  }

  async insertVersion(version: AnalysisVersion, unit: Unit): Promise<void> {
    const specification = JSON.stringify(version.specification);
    await this.versions.create({ ...version, specification }, within(unit));
  }
}

function parse(instance: AnalysisVersionModel): AnalysisVersion {
  const row = plain(instance);
  return { ...row, specification: JSON.parse(row.specification) as AnalysisSpecification };
}
