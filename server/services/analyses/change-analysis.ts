import type { AnalysisChangeRequest } from '#shared/api';
import type { AnalysisSpecification } from '#shared/analysis';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { Analysis, AnalysisVersion } from '../../models/analysis/analysis-store';
import type { Study } from '../../models/study/study-store';
import type { Unit } from '../../models/unit-of-work';
import type { User } from '../../models/user/user-store';
import { analysisUses } from '../reports/block-usage';
import { addVersion } from './add-version';
import { type ComputedResult, computeResult } from './compute-result';
import { isCurrent } from './store-result';

/**
 * Saves an analysis as a new version, computes it, and moves the pins of drafts that show it.
 *
 * Refused when somebody saved a newer version than the one it was made from, and, once a report
 * shows the analysis, when the contrast, a method or a level changes without a reason. Saving what
 * is there already changes nothing.
 */
export async function changeAnalysis(
  dependencies: Dependencies,
  person: User,
  study: Study,
  analysisId: string,
  request: AnalysisChangeRequest,
): Promise<Outcome<undefined>> {
  const found = await dependencies.database.stores.analyses.find(study.id, analysisId);
  if (found === null) return refuse('notFound');
  if (found.version !== request.baseVersion) return refuseStale(found);
  const computed = await computeResult(dependencies, study, request);
  if (!computed.ok) return computed;
  const saved = await dependencies.database.unitOfWork<Outcome<boolean>>(
    `study:${study.id}`,
    async (unit) => {
      if (!(await isCurrent(dependencies, computed.value, unit))) return { ok: true, value: false };
      const change = { person, study, analysisId, request, computed: computed.value };
      const stored = await saveChange(dependencies, change, unit);
      return stored.ok ? { ok: true, value: true } : stored;
    },
  );
  if (!saved.ok) return saved;
  if (!saved.value) return changeAnalysis(dependencies, person, study, analysisId, request);
  return { ok: true, value: undefined };
}

interface Change {
  readonly person: User;
  readonly study: Study;
  readonly analysisId: string;
  readonly request: AnalysisChangeRequest;
  readonly computed: ComputedResult;
}

async function saveChange(
  dependencies: Dependencies,
  { person, study, analysisId, request, computed }: Change,
  unit: Unit,
): Promise<Outcome<undefined>> {
  const { analyses } = dependencies.database.stores;
  const analysis = await analyses.find(study.id, analysisId, unit);
  if (analysis === null) return refuse('notFound');
  if (analysis.version !== request.baseVersion) return refuseStale(analysis);
  const present = await analyses.version(analysisId, analysis.version, unit);
  if (isSame(present, request)) return { ok: true, value: undefined };
  const reports = await reportsThatShow(dependencies, study.id, analysisId, unit);
  const reason = request.reason ?? '';
  const needsReason = !isSameSpecification(present, request) && reports.length > 0;
  if (needsReason && reason === '') return refuse('reasonRequired', { facts: { reports } });
  const { name, cutId, specification } = request;
  const words = { name, cutId, specification, reason: reason === '' ? null : reason };
  await addVersion(dependencies, analysis, { ...words, personId: person.id }, computed, unit);
  return { ok: true, value: undefined };
}

function refuseStale({ version }: Analysis): Outcome<never> {
  return refuse('staleAnalysis', { facts: { version } });
}

function isSame(present: AnalysisVersion, request: AnalysisChangeRequest): boolean {
  const { name, cutId } = present;
  return name === request.name && cutId === request.cutId && isSameSpecification(present, request);
}

function isSameSpecification(
  present: { readonly specification: AnalysisSpecification },
  request: { readonly specification: AnalysisSpecification },
): boolean {
  return JSON.stringify(present.specification) === JSON.stringify(request.specification);
}

async function reportsThatShow(
  dependencies: Dependencies,
  studyId: string,
  analysisId: string,
  unit: Unit,
): Promise<readonly string[]> {
  const uses = await analysisUses(dependencies, studyId, unit);
  return (uses.get(analysisId) ?? []).map(({ title }) => title);
}
