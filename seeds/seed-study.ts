import type { Dependencies } from '../server/dependencies';
import type { Study } from '../server/models/study/study-store';
import type { User } from '../server/models/user/user-store';
import { createAnalysis } from '../server/services/analyses/create-analysis';
import { addEstimate } from '../server/services/outside-estimates/add-estimates';
import { addMember } from '../server/services/studies/add-member';
import { createStudy } from '../server/services/studies/create-study';
import { putMilestone } from '../server/services/studies/put-milestone';
import { putOutcome } from '../server/services/studies/put-outcome';
import type { DemonstrationStudy } from './demonstration-study';
import { done } from './done';
import { loadCuts } from './load-cuts';
import type { SeededAccount } from './seed-accounts';
import { seedReport } from './seed-report';

/** Makes one demonstration study with its data, analyses and reports. */
export async function seedStudy(
  dependencies: Dependencies,
  accounts: readonly SeededAccount[],
  plan: DemonstrationStudy,
): Promise<void> {
  const lead = accountOf(accounts, 'lead');
  const study = await createStudy(dependencies, lead, plan.study, 'invented');
  const outcomeId = dependencies.ids.next();
  const outcome = { id: outcomeId, ...plan.outcome };
  done(await putOutcome(dependencies, lead, study, outcomeId, outcome));
  await addMembers(dependencies, accounts, study, lead);
  await addMilestones(dependencies, study, lead, plan);
  const analyst = accountOf(accounts, 'analyst');
  const cutId = await loadCuts(dependencies, analyst, study, plan);
  const analysisIds: Record<string, string> = {};
  for (const { key, name, specification, outside = [] } of plan.analyses) {
    const request = { name, cutId, specification: specification(outcomeId) };
    const analysisId = done(await createAnalysis(dependencies, analyst, study, request));
    const place = { studyId: study.id, analysisId };
    for (const entry of outside) done(await addEstimate(dependencies, analyst, place, entry));
    analysisIds[key] = analysisId;
  }
  for (const report of plan.reports) {
    await seedReport(dependencies, lead, study, report, analysisIds);
  }
}

function accountOf(accounts: readonly SeededAccount[], role: SeededAccount['role']): User {
  const account = accounts.find((candidate) => candidate.role === role);
  if (account === undefined) throw new Error(`There is no demonstration account for ${role}.`);
  return account.user;
}

async function addMembers(
  dependencies: Dependencies,
  accounts: readonly SeededAccount[],
  study: Study,
  lead: User,
): Promise<void> {
  for (const { email, role } of accounts) {
    if (role === 'administrator' || role === 'lead') continue;
    done(await addMember(dependencies, lead, study, { email, role }));
  }
}

async function addMilestones(
  dependencies: Dependencies,
  study: Study,
  lead: User,
  { milestones }: DemonstrationStudy,
): Promise<void> {
  for (const { title, inDays } of milestones) {
    const id = dependencies.ids.next();
    const dueDate = dayAfter(dependencies.clock.now(), inDays);
    done(await putMilestone(dependencies, lead, study.id, id, { id, title, dueDate }));
  }
}

function dayAfter(now: Date, days: number): string {
  const day = new Date(now.getTime() + days * 24 * 60 * 60 * 1000);
  return day.toISOString().slice(0, 10);
}
