export { conditionalLimits, conditionalOddsRatioOf } from './conditional-odds-ratio';
export type { ShareOfObserved } from './conditional-odds-ratio';
