import type { Member, Milestone, StudyView } from '#shared/api';
import type { OutcomeWords } from '#shared/analysis';
import type { StudyRole } from '#shared/permissions';
import type { Dependencies } from '../../dependencies';
import type { Outcome } from '../../models/study/outcome-store';
import type { StoredMilestone } from '../../models/study/milestone-store';
import type { Study } from '../../models/study/study-store';
import { initialsOf } from '../session/present-person';
import { summarise } from './list-studies';

/** A study with everything on its page, as a member with this role sees it. */
export async function viewStudy(
  dependencies: Dependencies,
  studyId: string,
  role: StudyRole,
): Promise<StudyView> {
  const { studies, studyFigures, outcomes, milestones } = dependencies.database.stores;
  const study = await studies.findById(studyId);
  if (study === null) throw new Error(`The study ${studyId} is gone.`);
  const figures = await studyFigures.of([studyId]);
  return {
    ...summarise(study, role, figures.get(studyId)),
    ...wordsOf(study),
    outcomes: (await outcomes.list(studyId)).map(presentOutcome),
    milestones: (await milestones.list(studyId)).map(presentMilestone),
    members: await listMembers(dependencies, studyId),
  };
}

function wordsOf({ population, peopleNoun }: Study): Pick<StudyView, 'population' | 'peopleNoun'> {
  return { population, peopleNoun };
}

/** The words of an outcome. */
export function presentOutcome(outcome: Outcome): OutcomeWords {
  const { id, noun, verbPhrase, timeFrame, desirability } = outcome;
  return { id, noun, verbPhrase, timeFrame, desirability };
}

function presentMilestone({ id, title, dueDate }: StoredMilestone): Milestone {
  return { id, title, dueDate };
}

async function listMembers({ database }: Dependencies, studyId: string): Promise<Member[]> {
  const memberships = await database.stores.memberships.ofStudy(studyId);
  const people = await database.stores.users.findMany(memberships.map(({ userId }) => userId));
  const byId = new Map(people.map((person) => [person.id, person]));
  return memberships.flatMap(({ userId, role }) => {
    const person = byId.get(userId);
    if (person === undefined) return [];
    const { name, email } = person;
    return [{ personId: userId, name, email, initials: initialsOf(name), role }];
  });
}
