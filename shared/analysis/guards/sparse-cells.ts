import type { LayerResult } from '../analysis-result';
import type { Guard, GuardPoint } from './guard';
import { layersOf, scopeOf } from './places';

/** Below this expected count the chi-square distribution is a poor guide. */
const SMALLEST_EXPECTED = 5;

/**
 * Cells of the outcome by exposure table with small expected counts: the chi-square test is an
 * approximation that they weaken. Facts: cells (how many are below), ofCells (all),
 * smallestExpected, limit, levelIds (of the levels with such a cell).
 */
export const sparseCells = {
  id: 'sparseCells',
  severity: 'caution',
  source:
    'Cochran WG. Some methods for strengthening the common chi-square tests. ' +
    'Biometrics 1954;10:417-451.',
  find: (result) => layersOf(result).flatMap(pointsOf),
} as const satisfies Guard<'sparseCells'>;

function pointsOf(layer: LayerResult): readonly GuardPoint[] {
  const { events, total } = layer.total;
  const filled = layer.levels.filter(({ count }) => count.total > 0);
  if (events === 0 || events === total || filled.length < 2) {
    return [];
  }
  const expected = filled.flatMap(({ levelId, count }) => [
    { levelId, expected: (count.total / total) * events },
    { levelId, expected: (count.total / total) * (total - events) },
  ]);
  const sparse = expected.filter((cell) => cell.expected < SMALLEST_EXPECTED);
  const facts = {
    cells: sparse.length,
    ofCells: expected.length,
    smallestExpected: Math.min(...expected.map((cell) => cell.expected)),
    limit: SMALLEST_EXPECTED,
    levelIds: [...new Set(sparse.map(({ levelId }) => levelId))],
  };
  return sparse.length > 0 ? [{ place: { scope: scopeOf(layer), levelId: null }, facts }] : [];
}
