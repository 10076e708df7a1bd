import { standardisedPoolings } from '../standardised/standardised-poolings';
import { greenlandRobins } from './greenland-robins';

/** Ways to pool a risk ratio, in the order in which they are offered. */
export const POOLED_RISK_RATIOS = { greenlandRobins, ...standardisedPoolings('ratio') } as const;

/** Id of a way to pool a risk ratio. */
export type PooledRiskRatioId = keyof typeof POOLED_RISK_RATIOS;
