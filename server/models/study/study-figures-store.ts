import { QueryTypes, type Sequelize } from 'sequelize';

/** What a list of studies says beside the study itself. */
export interface StudyFigures {
  readonly latestCutNumber: number | null;
  readonly reportCount: number;
}

interface CutRow {
  readonly studyId: string;
  readonly latestCutNumber: number;
}

interface ReportRow {
  readonly studyId: string;
  readonly reportCount: number;
}

/** Counts what belongs to studies: two queries, however many studies. */
export class StudyFiguresStore {
  constructor(private readonly sequelize: Sequelize) {}

  async of(studyIds: readonly string[]): Promise<ReadonlyMap<string, StudyFigures>> {
    if (studyIds.length === 0) return new Map();
    const cuts = new Map((await this.cuts(studyIds)).map((row) => [row.studyId, row]));
    const reports = new Map((await this.reports(studyIds)).map((row) => [row.studyId, row]));
    return new Map(
      studyIds.map((id) => [
        id,
        {
          latestCutNumber: cuts.get(id)?.latestCutNumber ?? null,
          reportCount: reports.get(id)?.reportCount ?? 0,
        },
      ]),
    );
  }

  private cuts(studyIds: readonly string[]): Promise<readonly CutRow[]> {
    return this.sequelize.query<CutRow>(
      `SELECT data_sets.study_id AS studyId, MAX(cuts.number) AS latestCutNumber
       FROM cuts JOIN data_sets ON data_sets.id = cuts.data_set_id
       WHERE cuts.state = 'ready' AND data_sets.study_id IN (:studyIds)
       GROUP BY data_sets.study_id`,
      { type: QueryTypes.SELECT, replacements: { studyIds: [...studyIds] } },
    );
  }

  private reports(studyIds: readonly string[]): Promise<readonly ReportRow[]> {
    return this.sequelize.query<ReportRow>(
      `SELECT study_id AS studyId, COUNT(*) AS reportCount
       FROM reports
       WHERE removed_at IS NULL AND study_id IN (:studyIds)
       GROUP BY study_id`,
      { type: QueryTypes.SELECT, replacements: { studyIds: [...studyIds] } },
    );
  }
}
