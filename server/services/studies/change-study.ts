import type { StudyChangeRequest } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import type { Study } from '../../models/study/study-store';
import type { User } from '../../models/user/user-store';
import { rewordAnalyses } from '../analyses/recompute-analyses';
import { recordStudyChange } from './record-study-change';

type Words = Pick<Study, 'title' | 'design' | 'population' | 'peopleNoun'>;

/**
 * Changes the words or the design of a study; what the request leaves out stays. Analyses follow,
 * since their results carry these words.
 */
export async function changeStudy(
  dependencies: Dependencies,
  person: User,
  study: Study,
  request: StudyChangeRequest,
): Promise<void> {
  const { database } = dependencies;
  const changed = await database.unitOfWork(`study:${study.id}`, async (unit) => {
    const present = (await database.stores.studies.findById(study.id, unit)) ?? study;
    const before = wordsOf(present);
    const after = merged(before, request);
    if (JSON.stringify(before) === JSON.stringify(after)) return null;
    await database.stores.studies.update(study.id, after, unit);
    const change = { studyId: study.id, personId: person.id, what: 'study.changed' };
    await recordStudyChange(dependencies, { ...change, before, after }, unit);
    return { ...present, ...after };
  });
  if (changed !== null) await rewordAnalyses(dependencies, person.id, changed);
}

function wordsOf({ title, design, population, peopleNoun }: Study): Words {
  return { title, design, population, peopleNoun };
}

function merged(before: Words, request: StudyChangeRequest): Words {
  return {
    title: request.title ?? before.title,
    design: request.design ?? before.design,
    population: request.population ?? before.population,
    peopleNoun: request.peopleNoun ?? before.peopleNoun,
  };
}
