export { fisherOfFourfold } from './fisher';
export { FOURFOLD_TESTS } from './fourfold-tests';
export type { FourfoldTest, FourfoldTestId } from './fourfold-tests';
export { pearsonOfFourfold, pearsonOfTable } from './pearson';
