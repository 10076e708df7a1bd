import type { Row } from './formula-error';

const STRATA = 'strata-and-trends';
const TABLES = 'tables-and-pairs';

const CHI_SQUARE: readonly Row[] = [
  [
    'Pearson',
    'stats/tests-of-association/pearson',
    'fourfold',
    '(table.index.total / total) * table.reference.total',
    '(table.index.total / total) * (table.reference.total - 1)',
  ],
  [
    'Yates',
    'stats/tests-of-association/fourfold-tests/yates',
    'exact',
    'Math.abs(apart) - total / 2',
    'Math.abs(apart) - total / 4',
  ],
  [
    'likelihood ratio',
    'stats/tests-of-association/fourfold-tests/likelihood-ratio',
    'exact',
    'part(table.reference.total * shares[1], excess)',
    'part(table.reference.total * shares[1], -excess)',
  ],
];

const FISHER: readonly Row[] = [
  [
    'two-sided',
    'stats/tests-of-association/fisher',
    'fourfold',
    'Math.min(1, ownTail + oppositeTail)',
    'Math.min(1, 2 * ownTail)',
  ],
  [
    'mid-p',
    'stats/tests-of-association/fourfold-tests/fisher-mid-p',
    'exact',
    'observed / 2',
    'observed',
  ],
];

const UNCONDITIONAL_TESTS: readonly Row[] = [
  [
    'Barnard',
    'stats/tests-of-association/fourfold-tests/barnard',
    'exact',
    'events * (index.total + reference.total - events)',
    'events * (index.total + reference.total)',
  ],
  [
    'Boschloo',
    'stats/tests-of-association/fourfold-tests/boschloo',
    'exact',
    'urnOf(a + c)), exact) <= 0',
    'urnOf(a + c)), exact) < 0',
  ],
];

const MULTIPLICITY: readonly Row[] = [
  ['Holm', 'stats/adjustments/holm', 'exact', 'count - place + 1', 'count - place'],
  ['Hochberg', 'stats/adjustments/hochberg', 'exact', "'falling'", "'rising'"],
  [
    'Benjamini–Hochberg',
    'stats/adjustments/benjamini-hochberg',
    'exact',
    'count / place',
    'count - place + 1',
  ],
];

const TREND: readonly Row[] = [
  [
    'Cochran–Armitage',
    'stats/trend/cochran-armitage',
    STRATA,
    'group.total * (group.score - centre) ** 2',
    'group.total * group.score ** 2',
  ],
  ['linear-by-linear', 'stats/trend/linear-by-linear', TABLES, '(total - 1) *', 'total *'],
  ['exact', 'stats/trend/exact-trend-tails', TABLES, '>= distance', '> distance'],
];

/** Wrong formulas for tests. */
export const TESTS: Readonly<Record<string, readonly Row[]>> = {
  'chi-square tests': CHI_SQUARE,
  "Fisher's test": FISHER,
  'exact unconditional tests': UNCONDITIONAL_TESTS,
  multiplicity: MULTIPLICITY,
  trend: TREND,
};
