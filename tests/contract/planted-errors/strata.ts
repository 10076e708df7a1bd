import type { Row } from './formula-error';

const PUBLISHED = 'published-examples';
const STRATA = 'strata-and-trends';
const STRATIFIED = 'stratified-methods';

const POOLED_DIFFERENCE: readonly Row[] = [
  [
    'Sato',
    'stats/stratified/mantel-haenszel-difference',
    STRATIFIED,
    '(reference.total - index.total)) / 2',
    '(index.total - reference.total)) / 2',
  ],
  [
    'Greenland–Robins',
    'stats/stratified/mantel-haenszel-difference',
    STRATIFIED,
    'const squaredWeight = weight(table) ** 2;',
    'const squaredWeight = weight(table);',
  ],
  [
    'weights',
    'stats/stratified/mantel-haenszel-difference',
    STRATIFIED,
    'return (table.index.total / sizeOf(table)) * table.reference.total;',
    'return table.reference.total;',
  ],
];

const POOLED_RATIO: readonly Row[] = [
  [
    'variance',
    'stats/stratified/mantel-haenszel-ratios',
    STRATIFIED,
    '(index.events / size) * reference.events',
    '(index.events / size) * (reference.events / 2)',
  ],
  [
    'estimate',
    'stats/stratified/mantel-haenszel-ratios',
    STRATIFIED,
    'crossPart(table.reference.events, table.index.total, table)',
    'crossPart(table.reference.events, table.reference.total, table)',
  ],
];

const POOLED_ODDS: readonly Row[] = [
  [
    'Robins–Breslow–Greenland',
    'stats/stratified/mantel-haenszel-ratios',
    STRATA,
    'one.agreeing * one.discordant + one.differing * one.concordant',
    'one.agreeing * one.concordant + one.differing * one.discordant',
  ],
  [
    'estimate',
    'stats/stratified/mantel-haenszel-ratios',
    STRATA,
    'crossPart(cells.indexOthers, cells.referenceEvents, table)',
    'crossPart(cells.indexOthers, cells.referenceOthers, table)',
  ],
];

const EXACT_COMMON_ODDS: readonly Row[] = [
  [
    'tails',
    'stats/stratified/conditional/conditional-odds-ratio',
    STRATIFIED,
    'const probability = above + share * at;',
    'const probability = above + at;',
  ],
  [
    'level',
    'stats/stratified/conditional/conditional-odds-ratio',
    STRATIFIED,
    'const tail = (1 - level) / 2;',
    'const tail = 1 - level;',
  ],
];

const CMH: readonly Row[] = [
  [
    'variance',
    'stats/stratified/cochran-mantel-haenszel',
    STRATA,
    '(events / (total - 1)) * others',
    '(events / total) * others',
  ],
  [
    'continuity correction',
    'stats/stratified/cochran-mantel-haenszel',
    PUBLISHED,
    "correction === 'half' ? 0.5 : 0",
    "correction === 'half' ? 0.25 : 0",
  ],
  [
    'generalised',
    'stats/stratified/generalised/generalised-test',
    STRATIFIED,
    '(total - 1),',
    'total,',
  ],
];

const HOMOGENEITY: readonly Row[] = [
  [
    'Tarone',
    'stats/stratified/homogeneity/breslow-day-tarone',
    STRATIFIED,
    'return deviation ** 2 / variance;',
    'return Math.abs(deviation) / variance;',
  ],
  [
    'Breslow–Day',
    'stats/fitted-odds-ratio',
    STRATIFIED,
    '1 / expected + 1 / (row - expected)',
    '1 / expected + 1 / row',
  ],
  [
    'inverse variance',
    'stats/stratified/homogeneity/inverse-variance',
    STRATA,
    '(valueOf(table) - mean) ** 2 / varianceOf(table)',
    '(valueOf(table) - mean) ** 2 / varianceOf(table) / 2',
  ],
];

const STANDARDISATION: readonly Row[] = [
  [
    'variance',
    'stats/standardised/standardised-risks',
    STRATIFIED,
    'share * share * varianceOfRisk(count)',
    'share * varianceOfRisk(count)',
  ],
  [
    'ratio',
    'stats/standardised/standardised-risks',
    STRATIFIED,
    'index.variance / index.risk ** 2',
    'index.variance / index.risk',
  ],
];

const INTERACTION: readonly Row[] = [
  [
    'ratio of ratios',
    'stats/interaction/ratio-of-ratios',
    STRATIFIED,
    'valueOf(first) / valueOf(second)',
    'valueOf(first) * valueOf(second)',
  ],
  [
    'square-and-add',
    'stats/interaction/difference-of-differences',
    STRATIFIED,
    'Math.hypot(one.below, other.above)',
    'Math.hypot(one.below, other.below)',
  ],
  [
    'relative excess risk',
    'stats/interaction/excess-risk',
    STRATIFIED,
    'neither: sumOfRatios,',
    'neither: sumOfRatios + 1,',
  ],
];

/** Wrong formulas over strata. */
export const STRATA_ERRORS: Readonly<Record<string, readonly Row[]>> = {
  'pooled difference': POOLED_DIFFERENCE,
  'pooled ratio': POOLED_RATIO,
  'pooled odds ratio': POOLED_ODDS,
  'exact common odds ratio': EXACT_COMMON_ODDS,
  'Cochran–Mantel–Haenszel tests': CMH,
  homogeneity: HOMOGENEITY,
  standardisation: STANDARDISATION,
  interaction: INTERACTION,
};
