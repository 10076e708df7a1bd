export type { Balance, BalanceGauge, BalanceSide, GaugeEdge } from './balance/balance';
export { balanceOf } from './balance/balance-of';
export type { Claim, ClaimGroup, ClaimIssue } from './claim';
export { claimOf } from './claim-of';
export type { ClaimTarget } from './claim-of';
export { issueWords } from './issue-words';
export type { WordedIssueCode } from './issue-words';
export { addressesOfPart, FRAMINGS, phraseText } from './phrase';
export type { Direction, Framing, Phrase, PhrasePart } from './phrase';
export { availableFramings, phraseOfClaim } from './phrase-of-claim';
export { fillPattern, fillWords, joinParts, startSentence } from './phrasebook/fill-pattern';
export type { Fillings, SlotFilling } from './phrasebook/fill-pattern';
export { parsePhrasebook } from './phrasebook/parse-phrasebook';
export type { PhrasebookIssue } from './phrasebook/parse-phrasebook';
export type {
  DesignTerms,
  MeasureTerms,
  OccurrenceTerms,
  PatternKey,
  Phrasebook,
} from './phrasebook/phrasebook';
