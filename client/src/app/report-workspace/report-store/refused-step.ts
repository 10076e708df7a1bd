import type { ApiProblem } from '../../server-api/api-problem';
import type { MadeStep } from './made-step';

/** A step that the server will not take, and what it said. */
export interface RefusedStep {
  readonly made: MadeStep;
  readonly problem: ApiProblem;
}
