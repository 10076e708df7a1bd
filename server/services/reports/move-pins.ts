import type { Dependencies } from '../../dependencies';
import type { StoredReport } from '../../models/report/report-store';
import type { Unit } from '../../models/unit-of-work';
import { noteStep, startJournal, storeJournal } from './journal';
import { readReport } from './open-report';

/** Which analysis is shown with which result from now on; null takes its pins away. */
export interface PinMove {
  readonly studyId: string;
  readonly analysisId: string;
  readonly resultId: string | null;
  readonly personId: string;
}

/**
 * Moves the pins of an analysis in every report that is a draft and shows it, each by a step. In
 * reports that are further on, a person accepts what moves.
 */
export async function movePins(
  dependencies: Dependencies,
  { studyId, analysisId, resultId, personId }: PinMove,
  unit: Unit,
): Promise<void> {
  const { reports, reportPins } = dependencies.database.stores;
  const pinning = new Set(await reportPins.reportsWith(analysisId, unit));
  const drafts = (await reports.list(studyId, unit)).filter(
    ({ id, stage }) => stage === 'drafting' && pinning.has(id),
  );
  for (const draft of drafts) {
    await movePin(dependencies, draft, { studyId, analysisId, resultId, personId }, unit);
  }
}

async function movePin(
  dependencies: Dependencies,
  draft: StoredReport,
  { analysisId, resultId, personId }: PinMove,
  unit: Unit,
): Promise<void> {
  const opened = await readReport(dependencies, draft, unit);
  if (opened.report.pins[analysisId] === resultId) return;
  const { ids } = dependencies;
  const frame = { id: ids.next(), groupId: ids.next(), undoes: null, personId };
  const step = { kind: 'movePin', analysisId, resultId } as const;
  const noted = noteStep(dependencies, startJournal(opened), frame, step);
  if (!noted.ok) throw new Error(`A pin could not be moved: ${noted.issue.code}`);
  await storeJournal(dependencies, noted.value, personId, unit);
}
