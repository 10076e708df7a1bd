export { cochranArmitage } from './cochran-armitage';
export { fisherOfFourfold } from './fisher';
export { pearsonOfFourfold, pearsonOfTable } from './pearson';
