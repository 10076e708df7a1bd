import { orderCodes } from '#shared/code-book';
import type { Guard } from './guard';
import { WHOLE } from './places';

/** With two levels there is no order to lose. */
const FEWEST_LEVELS = 3;

/**
 * The levels' labels state an order (numbers, bounds or words of a known scale), but the exposure
 * is kept as unordered, so that no trend is tested. Facts: ground (what the order rests on).
 */
export const orderedAsUnordered = {
  id: 'orderedAsUnordered',
  severity: 'note',
  source:
    'Armitage P. Tests for linear trends in proportions and frequencies. Biometrics 1955;11:375-386.',
  find({ frame, specification }) {
    const { ordered, levels } = frame.exposure;
    const { ground } = orderCodes(levels.map(({ label }) => label));
    const unused = !ordered && specification.trendScores === null && levels.length >= FEWEST_LEVELS;
    return unused && statesOrder(ground) ? [{ place: WHOLE, facts: { ground } }] : [];
  },
} as const satisfies Guard<'orderedAsUnordered'>;

/** Whether an order rests on what all labels say. */
export function statesOrder(ground: ReturnType<typeof orderCodes>['ground']): boolean {
  return ground === 'bounds' || ground === 'numbers' || ground === 'words';
}
