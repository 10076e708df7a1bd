import type { StudyView } from '#shared/api';
import type { Outcome } from '../../errors/server-issue';
import { findMembership } from '../../services/studies/find-membership';
import { viewStudy } from '../../services/studies/view-study';
import type { Call, OnStudy } from '../route';

/**
 * Answers a change of a study with the study as it is now, or with the refusal. A person may just
 * have changed the own role; who has just left sees the study a last time.
 */
export async function withStudy(
  { dependencies, study, person, role }: Call & OnStudy,
  changed: Outcome<undefined>,
): Promise<Outcome<StudyView>> {
  if (!changed.ok) return changed;
  const now = await findMembership(dependencies, person.id, study.id);
  return { ok: true, value: await viewStudy(dependencies, study.id, now?.role ?? role) };
}
