import type { ReportSummary, StudyView } from '#shared/api';
import { mayDo } from '#shared/permissions';

/** Something that waits for this person, and where to do it. */
export interface WaitingMatter {
  readonly id: string;
  readonly tag: string;
  readonly fact: string;
  readonly where: string;
  readonly verb: string;
  readonly link: readonly string[];
}

/** What this person can do next on a study, given their role on it. */
export function waitingOn(
  study: StudyView,
  reports: readonly ReportSummary[],
): readonly WaitingMatter[] {
  return [
    ...missingOutcome(study),
    ...missingData(study),
    ...missingReport(study, reports),
    ...reports.flatMap((report) => emptyReport(study, report)),
  ];
}

function missingOutcome(study: StudyView): readonly WaitingMatter[] {
  if (study.outcomes.length > 0 || !mayDo(study.role, 'manageStudy')) return [];
  return [
    {
      id: `outcome-${study.id}`,
      tag: 'Outcome',
      fact: 'No outcome has its words yet',
      where: study.title,
      verb: 'Name it',
      link: ['/studies', study.id],
    },
  ];
}

function missingData(study: StudyView): readonly WaitingMatter[] {
  if (study.latestCutNumber !== null || !mayDo(study.role, 'editData')) return [];
  return [
    {
      id: `data-${study.id}`,
      tag: 'Data',
      fact: 'No data are loaded yet',
      where: study.title,
      verb: 'Load data',
      link: ['/studies', study.id, 'data'],
    },
  ];
}

function missingReport(
  study: StudyView,
  reports: readonly ReportSummary[],
): readonly WaitingMatter[] {
  const canStart = study.latestCutNumber !== null && mayDo(study.role, 'editWordsBlocks');
  if (reports.length > 0 || !canStart) return [];
  return [
    {
      id: `report-${study.id}`,
      tag: 'Report',
      fact: 'Data are loaded, and no report is begun',
      where: study.title,
      verb: 'Begin one',
      link: ['/studies', study.id, 'reports'],
    },
  ];
}

function emptyReport(study: StudyView, report: ReportSummary): readonly WaitingMatter[] {
  if (report.blockCount > 0 || !mayDo(study.role, 'editWordsBlocks')) return [];
  return [
    {
      id: `empty-${report.id}`,
      tag: 'Report',
      fact: `“${report.title}” has no blocks yet`,
      where: study.title,
      verb: 'Open it',
      link: ['/studies', study.id, 'reports', report.id],
    },
  ];
}
