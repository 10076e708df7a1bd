import { standardisedPoolings } from '../standardised/standardised-poolings';
import { greenlandRobins } from './greenland-robins';
import { sato } from './sato';

/** Ways to pool a risk difference, in the order in which they are offered. */
export const POOLED_RISK_DIFFERENCES = {
  sato,
  greenlandRobins,
  ...standardisedPoolings('difference'),
} as const;

/** Id of a way to pool a risk difference. */
export type PooledRiskDifferenceId = keyof typeof POOLED_RISK_DIFFERENCES;
