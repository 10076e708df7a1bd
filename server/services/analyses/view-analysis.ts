import type { AnalysisView } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { Analysis, AnalysisVersion } from '../../models/analysis/analysis-store';
import type { CutFacts } from '../../models/cut/cut-facts-store';
import type { StoredResult } from '../../models/result/result-store';
import type { Study } from '../../models/study/study-store';
import { analysisUses } from '../reports/block-usage';
import { frameFor } from './compute-result';
import { summariseAnalysis } from './list-analyses';

/** An analysis with its newest result and the record of its changes. */
export async function viewAnalysis(
  dependencies: Dependencies,
  study: Study,
  analysisId: string,
): Promise<Outcome<AnalysisView>> {
  const { analyses, cutFacts, codeBooks } = dependencies.database.stores;
  const analysis = await analyses.find(study.id, analysisId);
  if (analysis === null) return refuse('notFound');
  const version = await analyses.version(analysisId, analysis.version);
  const result = await newestResult(dependencies, analysis);
  const cut = (await cutFacts.of([version.cutId])).get(version.cutId);
  const codeBook = await codeBooks.findById(result.codeBookId);
  if (cut === undefined || codeBook === null)
    throw new Error(`The data of ${analysisId} are gone.`);
  const uses = (await analysisUses(dependencies, study.id)).get(analysisId) ?? [];
  const view: AnalysisView = {
    ...summariseAnalysis(analysis, version, cut, uses),
    specification: version.specification,
    codeBookNumber: codeBook.number,
    cutDataDate: cut.dataDate,
    resultId: result.id,
    result: result.content,
    outside: [...(await dependencies.database.stores.outsideEstimates.ofAnalyses([analysisId]))],
    problem: await problemNow(dependencies, study, cut, version),
    changes: await changesOf(dependencies, analysisId),
  };
  return { ok: true, value: view };
}

async function newestResult({ database }: Dependencies, { id }: Analysis): Promise<StoredResult> {
  const newestId = await database.stores.results.newestId(id);
  const result = newestId === null ? null : await database.stores.results.findById(newestId);
  if (result === null) throw new Error(`Analysis ${id} has no result.`);
  return result;
}

/** Why the analysis cannot be computed under the present code book and words; null if it can. */
async function problemNow(
  dependencies: Dependencies,
  study: Study,
  { dataSetId }: CutFacts,
  { specification }: AnalysisVersion,
): Promise<string | null> {
  const codeBook = await dependencies.database.stores.codeBooks.newest(dataSetId);
  if (codeBook === null) return null;
  const frame = await frameFor(dependencies, study, codeBook, specification);
  if (frame.ok) return null;
  return frame.issue.detail ?? frame.issue.fields?.[0]?.message ?? null;
}

async function changesOf(
  { database }: Dependencies,
  analysisId: string,
): Promise<AnalysisView['changes']> {
  const history = await database.stores.analyses.history(analysisId);
  const people = await database.stores.users.findMany(history.map(({ personId }) => personId));
  const names = new Map(people.map(({ id, name }) => [id, name]));
  return history.map(({ number, at, personId, reason }) => ({
    version: number,
    at,
    person: names.get(personId) ?? '',
    reason,
  }));
}
