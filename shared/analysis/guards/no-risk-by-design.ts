import { designGivesRisk } from '#shared/effects';
import type { Guard } from './guard';
import { WHOLE } from './places';

/** The design samples by the outcome, so that risks cannot be had. Facts: design. */
export const noRiskByDesign = {
  id: 'noRiskByDesign',
  severity: 'note',
  source:
    'Vandenbroucke JP et al. Strengthening the Reporting of Observational Studies in Epidemiology ' +
    '(STROBE): explanation and elaboration. PLoS Medicine 2007;4:e297.',
  find: ({ frame }) =>
    designGivesRisk(frame.design) ? [] : [{ place: WHOLE, facts: { design: frame.design } }],
} as const satisfies Guard<'noRiskByDesign'>;
