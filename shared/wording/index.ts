export type { Claim, ClaimGroup } from './claim';
export { FRAMINGS, phraseText } from './phrase';
export type { Direction, Framing, Phrase, PhrasePart } from './phrase';
