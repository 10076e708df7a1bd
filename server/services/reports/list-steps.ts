import type { StepsView } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import { presentSteps } from './present-steps';

/** The most steps of one answer; `seq` tells that there are more. */
const MOST_STEPS = 1000;

/** The steps of a report after number `after`, and the number of its last one. */
export async function listSteps(
  dependencies: Dependencies,
  studyId: string,
  reportId: string,
  after: number,
): Promise<Outcome<StepsView>> {
  const { reports, steps } = dependencies.database.stores;
  const report = await reports.find(studyId, reportId);
  if (report === null) return refuse('notFound');
  const found = await steps.after(reportId, after, MOST_STEPS);
  const presented = await presentSteps(dependencies, found);
  return { ok: true, value: { seq: report.seq, steps: presented } };
}
