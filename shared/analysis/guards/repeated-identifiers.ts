import type { Guard } from './guard';
import { WHOLE } from './places';

/**
 * Some people (or other units) come more than once, while every method here takes records as
 * independent. Facts: columnId, columnLabel, identifiers (that repeat), records (they have).
 */
export const repeatedIdentifiers = {
  id: 'repeatedIdentifiers',
  severity: 'caution',
  source:
    'Donner A, Klar N. Design and Analysis of Cluster Randomization Trials in Health Research. ' +
    'Arnold 2000, chapter 1.',
  find: (_result, context) =>
    context.repeatedIdentifiers
      ? [{ place: WHOLE, facts: { ...context.repeatedIdentifiers } }]
      : [],
} as const satisfies Guard<'repeatedIdentifiers'>;
