export { adjustedResiduals } from './adjusted-residuals';
export { cramersV } from './cramers-v';
export { fisherOfTable } from './freeman-halton/freeman-halton';
export { likelihoodRatioOfTable } from './likelihood-ratio';
export { occupiedCounts } from './occupied-counts';
export type { OccupiedCounts } from './occupied-counts';
