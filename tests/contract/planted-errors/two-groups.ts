import type { Row } from './formula-error';

const PUBLISHED = 'published-examples';

const ONE_PROPORTION: readonly Row[] = [
  [
    'Wilson',
    'stats/intervals/risk/wilson',
    'fourfold',
    'scale = 2 * (total + square)',
    'scale = 2 * (total + 2 * square)',
  ],
  [
    'Clopper–Pearson',
    'stats/intervals/risk/clopper-pearson',
    'fourfold',
    'betaQuantile(tail, events, others + 1)',
    'betaQuantile(tail, events + 1, others)',
  ],
  [
    'Agresti–Coull',
    'stats/intervals/risk/agresti-coull',
    'open-data',
    '(events + (z * z) / 2) / size',
    '(events + z * z) / size',
  ],
  [
    'Jeffreys',
    'stats/intervals/risk/jeffreys',
    PUBLISHED,
    'betaQuantile(1 - tail, events + 0.5, others + 0.5)',
    'betaQuantile(1 - tail, events + 1, others + 0.5)',
  ],
  [
    'upper limit with no events',
    'stats/zero-events-limit',
    'exact',
    'Math.expm1(Math.log1p(-level) / total)',
    'Math.expm1(Math.log((1 - level) / 2) / total)',
  ],
];

const DIFFERENCE_CLOSED: readonly Row[] = [
  [
    'Wald',
    'stats/intervals/risk-difference/wald',
    'fourfold',
    '((total - events) / total)) / total',
    '((total - events) / total)) / (total - 1)',
  ],
  [
    'Newcombe',
    'stats/intervals/risk-difference/newcombe',
    PUBLISHED,
    'Math.hypot(indexRisk - indexLower, referenceUpper - referenceRisk)',
    'Math.hypot(indexRisk - indexLower, referenceRisk - referenceLower)',
  ],
  [
    'Agresti–Caffo',
    'stats/intervals/risk-difference/agresti-caffo',
    PUBLISHED,
    'const size = total + 2;',
    'const size = total + 4;',
  ],
];

const DIFFERENCE_SCORE: readonly Row[] = [
  [
    'factor of the variance',
    'stats/intervals/score/risk-difference-score',
    PUBLISHED,
    '(variance * total) / (total - 1)',
    'variance',
  ],
  [
    'variance under the tested difference',
    'stats/intervals/score/risk-difference-score',
    PUBLISHED,
    '(referenceRisk * (1 - referenceRisk)) / referenceTotal',
    '(indexRisk * (1 - indexRisk)) / referenceTotal',
  ],
];

const DIFFERENCE_EXACT: readonly Row[] = [
  [
    'tail of each side',
    'stats/unconditional/unconditional-intervals',
    'exact',
    "sides === 'both' ? 1 - level : (1 - level) / 2",
    "sides === 'both' ? (1 - level) / 2 : 1 - level",
  ],
  [
    'probability of tables',
    'stats/unconditional/null-family',
    'exact',
    'Math.min(1, Math.max(0, referenceRisk + tested))',
    'Math.min(1, Math.max(0, referenceRisk + tested / 2))',
  ],
];

const RISK_RATIO: readonly Row[] = [
  [
    'Katz',
    'stats/intervals/risk-ratio/katz',
    'fourfold',
    '(index.total - index.events) / index.total / index.events',
    '1 / index.events',
  ],
  [
    'score',
    'stats/intervals/score/risk-ratio-score',
    PUBLISHED,
    '(ratio * ratio * referenceRisk * otherShare)',
    '(ratio * referenceRisk * otherShare)',
  ],
  [
    'exact unconditional',
    'stats/unconditional/unconditional-intervals',
    'exact',
    "const tail = tailOf('upper', level);",
    "const tail = tailOf('both', level);",
  ],
];

const ODDS_RATIO_WALD: readonly Row[] = [
  [
    'Woolf',
    'stats/intervals/odds-ratio/woolf',
    'fourfold',
    '1 / cells.referenceEvents +',
    '1 / (cells.referenceEvents + 0.5) +',
  ],
  [
    'score',
    'stats/fitted-odds-ratio',
    PUBLISHED,
    '1 / (column - expected)',
    '1 / (row - expected)',
  ],
];

const ODDS_RATIO_CONDITIONAL: readonly Row[] = [
  [
    'exact limits',
    'stats/conditional/conditional-odds-ratio',
    'exact',
    'Math.log((1 - level) / 2)',
    'Math.log(1 - level)',
  ],
  [
    'mid-p limits',
    'stats/conditional/conditional-odds-ratio',
    'exact',
    'const tail = above + shareOfObserved * at;',
    'const tail = above + at;',
  ],
  [
    'estimate',
    'stats/conditional/tail-sums',
    'exact',
    'const excess = momentBelow + momentAbove;',
    'const excess = momentBelow + momentAbove + 0.01;',
  ],
];

/** Wrong formulas for one group and for two. */
export const TWO_GROUPS: Readonly<Record<string, readonly Row[]>> = {
  'one proportion': ONE_PROPORTION,
  'risk difference, closed': DIFFERENCE_CLOSED,
  'risk difference, score': DIFFERENCE_SCORE,
  'risk difference, exact': DIFFERENCE_EXACT,
  'risk ratio': RISK_RATIO,
  'odds ratio, log and score': ODDS_RATIO_WALD,
  'odds ratio, conditional': ODDS_RATIO_CONDITIONAL,
};
