import type { HouseStyle } from '#shared/house-style';
import type { ComposedReport } from '#shared/layout';
import { composeReport, type PinnedAnalysis, type Report } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import type { Outcome } from '../../errors/server-issue';
import { openReport } from './open-report';
import { pinnedAnalyses } from './pinned-analyses';
import { houseStyleOf } from './view-report';

/** A stored report as it prints, with what it was composed from. */
export interface ComposedStoredReport {
  readonly report: Report;
  readonly pins: readonly PinnedAnalysis[];
  readonly houseStyle: HouseStyle;
  readonly composed: ComposedReport;
  /** The moment of the report's last change. */
  readonly changedAt: string;
}

/**
 * Composes a report of a study from its stored blocks and pinned results: the same elements as the
 * proof on the screen. Exports draw these.
 */
export async function composeStoredReport(
  dependencies: Dependencies,
  studyId: string,
  reportId: string,
): Promise<Outcome<ComposedStoredReport>> {
  const opened = await openReport(dependencies, studyId, reportId);
  if (!opened.ok) return opened;
  const { report, stored } = opened.value;
  const pins = await pinnedAnalyses(dependencies, report);
  const houseStyle = houseStyleOf(dependencies, report.houseStyleId);
  const { phrasebook } = dependencies;
  const composed = composeReport({ report, pins, houseStyle, phrasebook });
  return { ok: true, value: { report, pins, houseStyle, composed, changedAt: stored.updatedAt } };
}
