export type { Balance, BalanceGauge, BalanceSide, GaugeEdge } from './balance/balance';
export { balanceOf } from './balance/balance-of';
export type { Claim, ClaimGroup, ClaimIssue } from './claim';
export { claimOf } from './claim-of';
export type { ClaimTarget } from './claim-of';
export { guardWords } from './guards/guard-words';
export type { GuardWords } from './guards/guard-words';
export { issueWords } from './issue-words';
export type { WordedIssueCode } from './issue-words';
export { outsideFindingWords } from './outside/outside-finding-words';
export { outsideAddress, outsidePValue, outsideText } from './outside/outside-numbers';
export {
  outsideHead,
  outsideMeasureName,
  outsideName,
  outsideNote,
  outsideSentence,
} from './outside/outside-words';
export type { OutsideColumn } from './outside/outside-words';
export { addressesOfPart, FRAMINGS, phraseText } from './phrase';
export type { Direction, Framing, Phrase, PhrasePart } from './phrase';
export { availableFramings, phraseOfClaim } from './phrase-of-claim';
export { capitalised, fillPattern, fillWords } from './phrasebook/fill-pattern';
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
export { altTextOf } from './print/alt-text';
export { valueAxisTitle } from './print/axis-titles';
export { columnHeads, headWithInterval } from './print/column-heads';
export type { ColumnHeads } from './print/column-heads';
export { contrastSentence } from './print/contrast-sentence';
export type { ContrastPart, ContrastSlot, ContrastWords } from './print/contrast-sentence';
export { pValueNotes } from './print/p-value-notes';
export type { PrintedPValues } from './print/p-value-notes';
export { figureNotes } from './print/figure-notes';
export { homogeneityWords } from './print/homogeneity-words';
export { methodsNoteOf } from './print/methods-note';
export { strataWords } from './print/print-context';
export type { PrintedAnalysis } from './print/print-context';
export { tableNotes } from './print/table-notes';
export type { TableContents } from './print/table-notes';
export { figureTitle, tableTitle } from './print/titles';
