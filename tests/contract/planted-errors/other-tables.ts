import type { Row } from './formula-error';

const PUBLISHED = 'published-examples';
const STRATA = 'strata-and-trends';
const TABLES = 'tables-and-pairs';

const ANY_SIZE: readonly Row[] = [
  [
    'Pearson',
    'stats/tests-of-association/pearson',
    STRATA,
    '((observed - expected) * (observed - expected)) / expected',
    '((observed - expected) * (observed - expected)) / (expected + 0.5)',
  ],
  [
    'likelihood ratio',
    'stats/tables-of-any-size/likelihood-ratio',
    TABLES,
    '2 * parts.reduce',
    'parts.reduce',
  ],
  [
    'Freeman–Halton',
    'stats/tables-of-any-size/freeman-halton/tail-of-tables',
    TABLES,
    'const wanted = sumOfLogs - logs.rounding;',
    'const wanted = sumOfLogs + logs.rounding;',
  ],
  [
    'residuals',
    'stats/tables-of-any-size/adjusted-residuals',
    TABLES,
    '(1 - row) * (1 - column)',
    '(1 - row)',
  ],
  [
    "Cramér's V",
    'stats/tables-of-any-size/cramers-v',
    TABLES,
    'Math.min(rowTotals.length, columnTotals.length)',
    'Math.max(rowTotals.length, columnTotals.length)',
  ],
];

const PAIRS: readonly Row[] = [
  [
    'McNemar',
    'stats/pairs/tests/mcnemar',
    TABLES,
    '(difference / (onlyFirst + onlySecond)) * difference',
    '(difference / (onlyFirst + onlySecond)) * (Math.abs(difference) - 1)',
  ],
  ['exact McNemar', 'stats/pairs/tests/mcnemar-exact', TABLES, '2 * binomial', 'binomial'],
  [
    'mid-p McNemar',
    'stats/pairs/tests/mcnemar-mid-p',
    TABLES,
    'observed / 2 : observed',
    'observed / 2 : observed / 2',
  ],
  [
    'Newcombe for pairs',
    'stats/pairs/differences/newcombe',
    TABLES,
    '2 * correlation * one * other',
    'correlation * one * other',
  ],
  ['Tango', 'stats/pairs/differences/tango', TABLES, 'tested * (1 - tested));', 'tested);'],
  [
    'matched odds ratio',
    'stats/pairs/odds-ratios/mid-p',
    TABLES,
    'binomialProbability(events, total, share) / 2',
    'binomialProbability(events, total, share)',
  ],
];

const RATES: readonly Row[] = [
  [
    'Garwood',
    'stats/rates/one-rate/garwood',
    'rates',
    'gammaUpperQuantile(tail, events + 1)',
    'gammaUpperQuantile(tail, events + 0.5)',
  ],
  [
    'Wald difference',
    'stats/rates/difference/wald',
    'rates',
    'reference.events / reference.time ** 2',
    'reference.events / reference.time / index.time',
  ],
  [
    'log ratio',
    'stats/rates/ratio/wald-log',
    'rates',
    '1 / table.index.events + 1 / table.reference.events',
    '1 / (table.index.events + table.reference.events)',
  ],
  [
    'pooled ratio',
    'stats/rates/pooled-rates',
    'rates',
    'events * indexShare(table) * referenceShare(table)',
    'events * indexShare(table)',
  ],
  [
    'standardised',
    'stats/rates/standardised-rate',
    'rates',
    'variance + largest ** 2',
    'variance + largest',
  ],
];

const IMPACT: readonly Row[] = [
  [
    'population fraction',
    'stats/impact/attributable-fractions',
    'impact',
    'fraction * (indexEvents + referenceOthers)',
    'fraction * referenceOthers',
  ],
  [
    'E-value',
    'stats/impact/e-value',
    'impact',
    'Math.sqrt(above * (above - 1))',
    'Math.sqrt(above * above - 1)',
  ],
];

const NUMBER_NEEDED: readonly Row[] = [
  [
    'estimate upwards',
    'effects/number-needed',
    PUBLISHED,
    'Math.ceil(inverse(difference))',
    'Math.floor(inverse(difference))',
  ],
  [
    'limits outwards',
    'effects/number-needed',
    PUBLISHED,
    'Math.floor(inverse(largest))',
    'Math.ceil(inverse(largest))',
  ],
  [
    'through infinity',
    'effects/number-needed',
    PUBLISHED,
    'if (lower < 0 && upper > 0) {',
    'if (lower > 0 && upper < 0) {',
  ],
];

const OUTSIDE: readonly Row[] = [
  [
    'p-value of the limits',
    'outside-estimates/check-numbers',
    'outside-estimates',
    'highest: 2 * normalUpperTail(nearest / widest)',
    'highest: normalUpperTail(nearest / widest)',
  ],
  [
    'scale of ratios',
    'outside-estimates/check-numbers',
    'outside-estimates',
    'Math.log(Math.max(0, value))',
    'Math.max(0, value)',
  ],
];

/** Wrong formulas for larger tables, pairs, rates and what is derived from results. */
export const OTHER_TABLES: Readonly<Record<string, readonly Row[]>> = {
  'tables of any size': ANY_SIZE,
  pairs: PAIRS,
  rates: RATES,
  impact: IMPACT,
  'number needed': NUMBER_NEEDED,
  'estimates from elsewhere': OUTSIDE,
};
