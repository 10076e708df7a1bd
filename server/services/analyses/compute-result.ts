import {
  ENGINE_VERSION,
  frameOf,
  tallyRequestOf,
  type AnalysisIssue,
  type AnalysisResult,
  type AnalysisSpecification,
  type ResultFrame,
} from '#shared/analysis';
import { issueWords } from '#shared/wording';
import { compute } from '../../computing/compute-off-thread';
import type { Dependencies } from '../../dependencies';
import { refuse, refuseField, type Outcome, type ServerIssue } from '../../errors/server-issue';
import type { CodeBookVersion } from '../../models/code-book/code-book-store';
import type { CutFacts } from '../../models/cut/cut-facts-store';
import type { Study } from '../../models/study/study-store';
import { countRecords } from '../tallies/count-records';
import { presentOutcome } from '../studies/view-study';

/** A result that was just computed, with the code book that it was counted under. */
export interface ComputedResult {
  readonly cut: CutFacts;
  readonly codeBook: CodeBookVersion;
  readonly engineVersion: string;
  readonly content: AnalysisResult;
}

/** What is to be computed on which cut. */
export interface Computation {
  readonly cutId: string;
  readonly specification: AnalysisSpecification;
}

/** Counts a cut under the newest code book of its data set, and computes an analysis from that. */
export async function computeResult(
  dependencies: Dependencies,
  study: Study,
  { cutId, specification }: Computation,
): Promise<Outcome<ComputedResult>> {
  const { cutFacts, codeBooks } = dependencies.database.stores;
  const cut = await cutFacts.findReady(study.id, cutId);
  if (cut === null) return refuseField('cutId', 'There is no such data cut in this study.');
  const codeBook = await codeBooks.newest(cut.dataSetId);
  if (codeBook === null) throw new Error(`Data set ${cut.dataSetId} has no code book.`);
  const frame = await frameFor(dependencies, study, codeBook, specification);
  if (!frame.ok) return frame;
  const request = tallyRequestOf(specification);
  const tally = await countRecords(dependencies, cutId, codeBook.content, request);
  if (!tally.ok) return tally;
  const result = await compute({ specification, frame: frame.value, tally: tally.value });
  if (!result.ok) return refuse('analysisNotComputable', problemOf(dependencies, result.issue));
  const computed = { cut, codeBook, engineVersion: ENGINE_VERSION, content: result.value };
  return { ok: true, value: computed };
}

/** The words and levels that an analysis has under a code book, as study and outcome are worded. */
export async function frameFor(
  dependencies: Dependencies,
  study: Study,
  codeBook: CodeBookVersion,
  specification: AnalysisSpecification,
): Promise<Outcome<ResultFrame>> {
  const { outcomeId } = specification.outcome;
  const outcome = await dependencies.database.stores.outcomes.find(study.id, outcomeId);
  if (outcome === null) {
    return refuseField('specification.outcome.outcomeId', 'The study has no such outcome.');
  }
  const frame = frameOf(codeBook.content, specification, presentOutcome(outcome), study);
  return frame.ok ? frame : refuse('analysisNotComputable', problemOf(dependencies, frame.issue));
}

function problemOf({ phrasebook }: Dependencies, issue: AnalysisIssue): Omit<ServerIssue, 'code'> {
  const words = issueWords(issue, phrasebook);
  const detail = `${words.charAt(0).toUpperCase()}${words.slice(1)}.`;
  return { detail, facts: { ...issue.facts, issue: issue.code } };
}
