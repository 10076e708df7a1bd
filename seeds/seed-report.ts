import { generateNKeysBetween } from 'fractional-indexing';
import type { StepSubmission } from '#shared/api';
import type { Dependencies } from '../server/dependencies';
import type { Study } from '../server/models/study/study-store';
import type { User } from '../server/models/user/user-store';
import { acceptSteps } from '../server/services/reports/accept-steps';
import { createReport } from '../server/services/reports/create-report';
import type { DemonstrationReport } from './demonstration-study';
import { done } from './done';

/** Writes a demonstration report, step by step like anybody else. */
export async function seedReport(
  dependencies: Dependencies,
  person: User,
  study: Study,
  { title, houseStyleId, framing, blocks }: DemonstrationReport,
  analysisIds: Readonly<Record<string, string>>,
): Promise<void> {
  const { ids } = dependencies;
  const request = { title, houseStyleId };
  const reportId = done(await createReport(dependencies, person, study.id, request));
  const planned = blocks({ analysisIds, nextId: () => ids.next() });
  const orderKeys = generateNKeysBetween(null, null, planned.length);
  const inserts = planned.map((block, at) => ({
    kind: 'insertBlock',
    block: { ...block, orderKey: orderKeys[at] },
  }));
  const groupId = ids.next();
  const steps: readonly StepSubmission[] = [{ kind: 'setFraming', framing }, ...inserts].map(
    (step) => ({ id: ids.next(), groupId, undoes: null, step }),
  );
  const sender = { person, studyId: study.id, reportId };
  done(await acceptSteps(dependencies, sender, { steps: [...steps] }));
}
