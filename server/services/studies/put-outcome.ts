import type { OutcomeWords } from '#shared/analysis';
import type { Dependencies } from '../../dependencies';
import { refuseField, type Outcome as Answer } from '../../errors/server-issue';
import type { Study } from '../../models/study/study-store';
import type { Unit } from '../../models/unit-of-work';
import type { User } from '../../models/user/user-store';
import { rewordAnalyses } from '../analyses/recompute-analyses';
import { recordStudyChange } from './record-study-change';
import { presentOutcome } from './view-study';

/**
 * Adds an outcome to a study, or changes its words; the analyses that count it follow. The id in
 * the address and the body agree.
 */
export async function putOutcome(
  dependencies: Dependencies,
  person: User,
  study: Study,
  outcomeId: string,
  words: OutcomeWords,
): Promise<Answer<undefined>> {
  if (words.id !== outcomeId) return refuseField('id', 'This must be the id in the address.');
  await dependencies.database.unitOfWork(`study:${study.id}`, (unit) =>
    store(dependencies, person, study.id, words, unit),
  );
  await rewordAnalyses(dependencies, person.id, study);
  return { ok: true, value: undefined };
}

async function store(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  words: OutcomeWords,
  unit: Unit,
): Promise<void> {
  const { outcomes } = dependencies.database.stores;
  const present = await outcomes.list(studyId, unit);
  const stored = present.find(({ id }) => id === words.id);
  const position = stored?.position ?? (present.at(-1)?.position ?? 0) + 1;
  await outcomes.put({ studyId, position, ...words }, unit);
  const before = stored === undefined ? null : presentOutcome(stored);
  if (JSON.stringify(before) === JSON.stringify(presentOutcome({ studyId, position, ...words }))) {
    return;
  }
  const what = before === null ? 'outcome.added' : 'outcome.changed';
  const change = { studyId, personId: person.id, what, before, after: words };
  await recordStudyChange(dependencies, change, unit);
}
