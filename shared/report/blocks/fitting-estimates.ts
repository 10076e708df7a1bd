import type { ResultFrame } from '#shared/analysis';
import { readOutsideNumbers } from '#shared/outside-estimates';
import type { OutsideEstimate } from '#shared/outside-estimates';

/**
 * The estimates from elsewhere that compare what a result compares. One against another reference,
 * or of a level that is gone, says something else than what stands beside it and is left out.
 */
export function fittingEstimates(
  outside: readonly OutsideEstimate[],
  { exposure }: Pick<ResultFrame, 'exposure'>,
): readonly OutsideEstimate[] {
  const { levels, referenceLevelId } = exposure;
  return outside.filter(
    (estimate) =>
      estimate.referenceLevelId === referenceLevelId &&
      estimate.levelId !== referenceLevelId &&
      (estimate.levelId === null || levels.some(({ id }) => id === estimate.levelId)) &&
      readOutsideNumbers(estimate) !== null,
  );
}
