import type { StudySummary } from '#shared/api';
import type { StudyRole } from '#shared/permissions';
import type { Dependencies } from '../../dependencies';
import type { StudyFigures } from '../../models/study/study-figures-store';
import type { Study } from '../../models/study/study-store';
import type { User } from '../../models/user/user-store';

/** The studies that a person is a member of, the latest changed first. */
export async function listStudies(
  { database }: Dependencies,
  person: User,
): Promise<readonly StudySummary[]> {
  const { memberships, studies, studyFigures } = database.stores;
  const mine = await memberships.ofUser(person.id);
  const roles = new Map(mine.map(({ studyId, role }) => [studyId, role]));
  const found = await studies.findMany([...roles.keys()]);
  const figures = await studyFigures.of([...roles.keys()]);
  return found.map((study) =>
    summarise(study, roles.get(study.id) ?? 'reader', figures.get(study.id)),
  );
}

/** A study as lists show it, with the role of who looks. */
export function summarise(
  study: Study,
  role: StudyRole,
  figures: StudyFigures | undefined,
): StudySummary {
  const { id, title, design, invented, updatedAt } = study;
  const { latestCutNumber = null, reportCount = 0 } = figures ?? {};
  return { id, title, design, role, invented, latestCutNumber, reportCount, updatedAt };
}
