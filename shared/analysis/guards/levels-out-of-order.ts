import { orderCodes } from '#shared/code-book';
import type { Guard } from './guard';
import { statesOrder } from './ordered-as-unordered';
import { WHOLE } from './places';

/**
 * The exposure is ordered, but its levels stand in another order than their labels state ("120+"
 * before "40-79"): the trend would be tested along a wrong order. Neither rising nor falling order
 * is found. Facts: levelIds (in the order that the labels state).
 */
export const levelsOutOfOrder = {
  id: 'levelsOutOfOrder',
  severity: 'caution',
  source:
    'Armitage P. Tests for linear trends in proportions and frequencies. Biometrics 1955;11:375-386.',
  find({ frame }) {
    const { ordered, levels } = frame.exposure;
    const labels = levels.map(({ label }) => label);
    const { codes, ground } = orderCodes(labels);
    const wrong = ![codes, codes.toReversed()].some((order) => isSame(order, labels));
    const levelIds = codes.map((code) => levels[labels.indexOf(code)]?.id ?? '');
    return ordered && statesOrder(ground) && wrong ? [{ place: WHOLE, facts: { levelIds } }] : [];
  },
} as const satisfies Guard<'levelsOutOfOrder'>;

function isSame(left: readonly string[], right: readonly string[]): boolean {
  return left.every((value, place) => value === right[place]);
}
