import type { AnalysisResult } from '#shared/analysis';
import { checkNumbers } from '#shared/outside-estimates';
import type { OutsideEstimateEntry, OutsideFinding } from '#shared/outside-estimates';
import { outsideFindingWords } from '#shared/wording';
import type { Dependencies } from '../../dependencies';
import { type FieldProblem, type Outcome, refuse } from '../../errors/server-issue';
import { houseStyleOf } from '../reports/view-report';

/** Says field by field what keeps an entry from standing beside the result of an analysis. */
export function checkEntry(
  dependencies: Dependencies,
  entry: OutsideEstimateEntry,
  result: AnalysisResult,
): Outcome<undefined> {
  const refused = checkNumbers(entry).filter(({ severity }) => severity === 'refusal');
  const fields = [
    ...placeProblems(entry, result),
    ...refused.map((finding) => ({
      path: fieldOf(finding),
      message: wordsOf(dependencies, finding),
    })),
  ];
  return fields.length === 0
    ? { ok: true, value: undefined }
    : refuse('invalidRequest', { fields });
}

/** The words of a finding, in the style that most reports have. */
export function wordsOf(dependencies: Dependencies, finding: OutsideFinding): string {
  return outsideFindingWords(finding, houseStyleOf(dependencies, ''), dependencies.phrasebook);
}

function placeProblems(
  { levelId, referenceLevelId }: OutsideEstimateEntry,
  { frame }: AnalysisResult,
): readonly FieldProblem[] {
  const { levels, referenceLevelId: present } = frame.exposure;
  const known = levelId === null || levels.some(({ id }) => id === levelId);
  const level = known && levelId !== present ? [] : [LEVEL_PROBLEM];
  return referenceLevelId === present ? level : [...level, REFERENCE_PROBLEM];
}

const LEVEL_PROBLEM: FieldProblem = {
  path: 'levelId',
  message: 'Pick a level that the analysis compares with its reference.',
};

const REFERENCE_PROBLEM: FieldProblem = {
  path: 'referenceLevelId',
  message: 'The analysis has another reference level now. Enter the estimate against that one.',
};

function fieldOf({ id, facts }: OutsideFinding): string {
  if (id === 'numberNotReadable') return String(facts.field);
  if (id === 'pValueNotReadable') return 'pValue';
  return id === 'limitsReversed' ? 'lower' : 'value';
}
