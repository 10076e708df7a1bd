export { NOT_IN_CODE_BOOK, OUTSIDE_BANDS } from './classify-codes';
export type { Codes, EncodedColumn, EncodedCut } from './encoded-cut';
export { checkCounts } from './row-weights';
export type { LeftOut, Restriction, Tally, TallyAxis, TallyCell, TallyRequest } from './tally';
export { countTally, createTallyCounter } from './tally-counter';
export type { TallyCounter } from './tally-counter';
export { tallyIssueMessage } from './tally-issue';
export type { TallyIssue } from './tally-issue';
