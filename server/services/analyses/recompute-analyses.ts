import type { Dependencies } from '../../dependencies';
import type { Analysis } from '../../models/analysis/analysis-store';
import type { Study } from '../../models/study/study-store';
import type { Unit } from '../../models/unit-of-work';
import { movePins } from '../reports/move-pins';
import { addVersion } from './add-version';
import { type ComputedResult, computeResult, frameFor } from './compute-result';
import { isCurrent, storeResult } from './store-result';

/**
 * Recomputes the analyses of a data set under its newest code book, and moves the pins of drafts.
 *
 * Call it after a new code book is stored, outside a unit of work. An analysis that the code book
 * no longer allows keeps its last result; its view says what is wrong.
 */
export async function repinReports(
  dependencies: Dependencies,
  personId: string,
  study: Study,
  dataSetId: string,
): Promise<void> {
  for (const analysis of await dependencies.database.stores.analyses.ofDataSet(dataSetId)) {
    await recompute(dependencies, personId, study, analysis);
  }
}

/**
 * Saves the analyses of a study again where its words or those of an outcome changed: a result
 * carries its words, so that new words need a new version. Call it outside a unit of work.
 */
export async function rewordAnalyses(
  dependencies: Dependencies,
  personId: string,
  study: Study,
): Promise<void> {
  for (const analysis of await dependencies.database.stores.analyses.list(study.id)) {
    await reword(dependencies, personId, study, analysis);
  }
}

/** Noted with a version that only words made. */
const NEW_WORDS = 'The words of the study or of the outcome changed.';

async function recompute(
  dependencies: Dependencies,
  personId: string,
  study: Study,
  { id: analysisId, version }: Analysis,
): Promise<void> {
  const words = await dependencies.database.stores.analyses.version(analysisId, version);
  const computed = await computeResult(dependencies, study, words);
  if (!computed.ok) return;
  const key = { analysisId, analysisVersion: version };
  await storeIfCurrent(dependencies, study, computed.value, async (unit) => {
    const resultId = await storeResult(dependencies, key, computed.value, unit);
    const move = { studyId: study.id, analysisId, resultId, personId };
    await movePins(dependencies, move, unit);
  });
}

async function reword(
  dependencies: Dependencies,
  personId: string,
  study: Study,
  analysis: Analysis,
): Promise<void> {
  const { analyses } = dependencies.database.stores;
  const words = await analyses.version(analysis.id, analysis.version);
  if (!(await isReworded(dependencies, study, analysis))) return;
  const computed = await computeResult(dependencies, study, words);
  if (!computed.ok) return;
  const { name, cutId, specification } = words;
  const version = { name, cutId, specification, reason: NEW_WORDS, personId };
  await storeIfCurrent(dependencies, study, computed.value, async (unit) => {
    const present = await analyses.find(study.id, analysis.id, unit);
    if (present?.version !== analysis.version) return;
    await addVersion(dependencies, present, version, computed.value, unit);
  });
}

async function isReworded(
  dependencies: Dependencies,
  study: Study,
  analysis: Analysis,
): Promise<boolean> {
  const { results, codeBooks } = dependencies.database.stores;
  const newestId = await results.newestId(analysis.id);
  const result = newestId === null ? null : await results.findById(newestId);
  const codeBook = result === null ? null : await codeBooks.findById(result.codeBookId);
  if (result === null || codeBook === null) return false;
  const { specification, frame: before } = result.content;
  const frame = await frameFor(dependencies, study, codeBook, specification);
  return frame.ok && JSON.stringify(frame.value) !== JSON.stringify(before);
}

/** Whoever stored a newer code book meanwhile recomputes the analyses too. */
async function storeIfCurrent(
  dependencies: Dependencies,
  study: Study,
  computed: ComputedResult,
  store: (unit: Unit) => Promise<void>,
): Promise<void> {
  await dependencies.database.unitOfWork(`study:${study.id}`, async (unit) => {
    if (await isCurrent(dependencies, computed, unit)) await store(unit);
  });
}
