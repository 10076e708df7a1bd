import { betaCumulative } from '../../distributions';
import { zeroOfDecreasing } from '../../intervals/score/bisection';
import { rateRatioMethod } from './rate-ratio-method';
import { limitsOfSplit } from './split-limits';

const FARTHEST_LOG_ODDS = 60;

/**
 * Conditional mid-p interval for a rate ratio, index over reference.
 *
 * As the exact conditional interval, with half the probability of the observed split; gives ratios.
 * Lower limit 0 without events in the index group; none in the reference group gives `zeroCell`,
 * in either `noEvents`.
 *
 * Source: Berry and Armitage (1995) The Statistician 44:417-423.
 */
export const midPConditional = rateRatioMethod({
  id: 'midPConditional',
  label: 'Conditional mid-p',
  shortLabel: 'mid-p',
  citation:
    'Berry G, Armitage P. Mid-P confidence intervals: a brief review. ' +
    'The Statistician 1995;44:417-423.',
  limits: (table, _z, level) =>
    limitsOfSplit(table, (events, others) => lowerOdds(events, others, (1 - level) / 2)),
});

function lowerOdds(events: number, others: number, tail: number): number {
  const logOdds = zeroOfDecreasing(
    (at) => tail - midTail(events, others, 1 / (1 + Math.exp(-at))),
    -FARTHEST_LOG_ODDS,
    FARTHEST_LOG_ODDS,
  );
  return Math.exp(logOdds);
}

/** P(X > events) + P(X = events) / 2 where each of all events falls here with a given chance. */
function midTail(events: number, others: number, chance: number): number {
  const atLeast = betaCumulative(chance, events, others + 1);
  const more = others === 0 ? 0 : betaCumulative(chance, events + 1, others);
  return (atLeast + more) / 2;
}
