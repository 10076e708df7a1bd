import type { MethodWords } from '../../intervals/interval-method';

const citation =
  'Landis JR, Heyman ER, Koch GG. Average partial association in three-way contingency tables: ' +
  'a review and discussion of alternative tests. ' +
  'International Statistical Review 1978;46:237-254.';

/** Names and source of the generalised tests over strata. */
export const GENERALISED_TESTS = {
  generalAssociation: {
    id: 'generalAssociation',
    label: 'Generalised Cochran–Mantel–Haenszel test of general association',
    shortLabel: 'general association',
    citation,
  },
  rowMeanScores: {
    id: 'rowMeanScores',
    label: 'Generalised Cochran–Mantel–Haenszel test of row mean scores',
    shortLabel: 'row mean scores',
    citation,
  },
  scoreCorrelation: {
    id: 'scoreCorrelation',
    label: 'Generalised Cochran–Mantel–Haenszel test of correlation',
    shortLabel: 'correlation of scores',
    citation,
  },
} as const satisfies Readonly<Record<string, MethodWords>>;
