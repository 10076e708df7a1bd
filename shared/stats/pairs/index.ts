export { PAIRED_DIFFERENCE_INTERVALS } from './differences';
export type { PairedDifferenceIntervalId } from './differences';
export { MATCHED_ODDS_RATIO_INTERVALS } from './odds-ratios';
export type { MatchedOddsRatioIntervalId } from './odds-ratios';
export { issueOfPairs, matchedOddsRatioOf, pairedDifferenceOf, pairsOf } from './paired-table';
export type { PairedTable } from './paired-table';
export { PAIRED_TESTS } from './tests';
export type { PairedTestId } from './tests';
export type { PairedTest } from './tests/paired-test';
