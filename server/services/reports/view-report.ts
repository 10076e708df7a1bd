import type { ReportView } from '#shared/api';
import type { HouseStyle } from '#shared/house-style';
import type { Dependencies } from '../../dependencies';
import type { Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { listDrafts } from '../drafts/list-drafts';
import { openReport } from './open-report';
import { pinnedAnalyses } from './pinned-analyses';

/** A report with its pinned results, its house style, and what this person was typing in it. */
export async function viewReport(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  reportId: string,
): Promise<Outcome<ReportView>> {
  const opened = await openReport(dependencies, studyId, reportId);
  if (!opened.ok) return opened;
  const { report } = opened.value;
  const value = {
    report: { ...report, blocks: [...report.blocks], pins: { ...report.pins } },
    pins: [...(await pinnedAnalyses(dependencies, report))],
    houseStyle: houseStyleOf(dependencies, report.houseStyleId),
    drafts: await listDrafts(dependencies, report, person.id),
  };
  return { ok: true, value };
}

/** A house style by id. One that is no longer installed leaves the report readable in another. */
export function houseStyleOf({ houseStyles }: Dependencies, id: string): HouseStyle {
  const style = houseStyles.find((one) => one.id === id) ?? houseStyles[0];
  if (style === undefined) throw new Error('No house style is installed.');
  return style;
}
