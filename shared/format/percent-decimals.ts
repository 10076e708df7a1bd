import type { PercentStyle } from '#shared/house-style';
import type { GroupCount } from '#shared/stats';

/** The decimals of all percentages of an analysis, by the denominators that are printed. */
export function percentDecimals(groups: readonly GroupCount[], style: PercentStyle): number {
  const shown = groups.filter(({ total }) => percentIsShown(total, style));
  const votes = shown.map(({ total }) => decimalsForDenominator(total, style));
  const decimals =
    style.mixedDenominators === 'smallest' ? Math.min(...votes, 2) : mostFrequent(votes);
  return votes.length === 0 ? 0 : decimals + (someShareIsSmall(shown, style) ? 1 : 0);
}

/** Whether a group is large enough for a percentage; smaller ones show counts only. */
export function percentIsShown(denominator: number, style: PercentStyle): boolean {
  return denominator > 0 && denominator >= style.countsOnlyBelow;
}

function decimalsForDenominator(denominator: number, style: PercentStyle): number {
  const step = style.decimalsByDenominator.findLast(({ from }) => denominator >= from);
  return step?.decimals ?? 0;
}

/** The value that most groups ask for; of two equally frequent ones the smaller. */
function mostFrequent(votes: readonly number[]): number {
  const countOf = (value: number): number => votes.filter((vote) => vote === value).length;
  return [...new Set(votes)].toSorted((a, b) => countOf(b) - countOf(a) || a - b)[0] ?? 0;
}

function someShareIsSmall(groups: readonly GroupCount[], style: PercentStyle): boolean {
  const limit = style.oneMoreDecimalBelow;
  return (
    limit !== null && groups.some(({ events, total }) => events > 0 && events * 100 < limit * total)
  );
}
