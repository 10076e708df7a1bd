import type { ModelStatic, Sequelize } from 'sequelize';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineReportPins, type ReportPinModel } from './report-pin-model';

/** The result that each analysis of a report is shown with, by analysis id. */
export type Pins = Readonly<Record<string, string>>;

/** Reads and writes which results reports show. */
export class ReportPinStore {
  private readonly pins: ModelStatic<ReportPinModel>;

  constructor(sequelize: Sequelize) {
    this.pins = defineReportPins(sequelize);
  }

  async of(reportId: string, unit?: Unit): Promise<Pins> {
    const rows = await this.pins.findAll({ where: { reportId }, ...within(unit) });
    return Object.fromEntries(
      rows.map(plain).map(({ analysisId, resultId }) => [analysisId, resultId]),
    );
  }

  /** Ids of the reports that pin this analysis. */
  async reportsWith(analysisId: string, unit?: Unit): Promise<readonly string[]> {
    const rows = await this.pins.findAll({ where: { analysisId }, ...within(unit) });
    return rows.map((row) => plain(row).reportId);
  }

  /** Makes the stored pins of a report equal to `after`, which differs from `before`. */
  async change(reportId: string, before: Pins, after: Pins, unit: Unit): Promise<void> {
    for (const analysisId of Object.keys(before).filter((id) => after[id] === undefined)) {
      await this.pins.destroy({ where: { reportId, analysisId }, ...within(unit) });
    }
    for (const [analysisId, resultId] of Object.entries(after)) {
      if (before[analysisId] === resultId) continue;
      await this.pins.upsert({ reportId, analysisId, resultId }, within(unit));
    }
  }
}
