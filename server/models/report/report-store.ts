import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import { plain, plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineReports, type ReportModel } from './report-model';

/** A report as stored, without its blocks and pins. */
export type StoredReport = Readonly<InferAttributes<ReportModel>>;

/** What a step may change of a report itself. */
export type ReportChange = Pick<
  StoredReport,
  'title' | 'seq' | 'framing' | 'houseStyleId' | 'updatedAt' | 'updatedBy'
>;

/** Reads and writes reports. */
export class ReportStore {
  private readonly reports: ModelStatic<ReportModel>;

  constructor(sequelize: Sequelize) {
    this.reports = defineReports(sequelize);
  }

  /** Finds a report of this study that was not removed; another study's is not found. */
  async find(studyId: string, id: string, unit?: Unit): Promise<StoredReport | null> {
    const where = { studyId, id, removedAt: null };
    return plainOrNull(await this.reports.findOne({ where, ...within(unit) }));
  }

  /** The reports of a study, the latest changed first. */
  async list(studyId: string, unit?: Unit): Promise<readonly StoredReport[]> {
    const order: [string, string][] = [
      ['updatedAt', 'DESC'],
      ['id', 'ASC'],
    ];
    const where = { studyId, removedAt: null };
    return (await this.reports.findAll({ where, order, ...within(unit) })).map(plain);
  }

  async insert(report: StoredReport, unit: Unit): Promise<void> {
    await this.reports.create(report, within(unit));
  }

  /** Changes the report if its last step is still number `seq`; says whether it was. */
  async update(id: string, seq: number, change: ReportChange, unit: Unit): Promise<boolean> {
    const [changed] = await this.reports.update(change, {
      where: { id, seq, removedAt: null },
      ...within(unit),
    });
    return changed === 1;
  }

  async remove(id: string, removedAt: string, unit: Unit): Promise<void> {
    await this.reports.update({ removedAt }, { where: { id }, ...within(unit) });
  }
}
