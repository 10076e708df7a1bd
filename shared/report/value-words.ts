import type { AddressedQuantity, AddressFacet, ResultScope, ValueAddress } from '#shared/analysis';
import { contrastTestId, fractionInExposedAt } from '#shared/analysis';
import type { AnalysisResult } from '#shared/analysis';
import type { EffectMeasureId } from '#shared/effects';
import { TEST_METHODS } from '#shared/stats';
import type { MethodWords } from '#shared/stats';
import type { PinnedAnalysis } from './report';
import { capitalised, outsideMeasureName } from '#shared/wording';
import type { DesignTerms, Phrasebook } from '#shared/wording';

/** A value in words, for lists: what it is, of whom, and where. */
export interface ValueWords {
  /** "Risk difference" */
  readonly what: string;
  /** "Over 6 h against none" */
  readonly whom: string;
  /** "Hospital ward" */
  readonly where: string;
}

/** Names the value at an address in the terms that the study's design allows. */
export function valueWords(
  address: ValueAddress,
  pin: PinnedAnalysis,
  phrasebook: Phrasebook,
): ValueWords {
  const terms = phrasebook.terms[pin.result.frame.design];
  return {
    what: QUANTITIES[address.quantity](terms, pin, { address, phrasebook }) + FACETS[address.facet],
    whom: groupWords(address, pin),
    where: scopeWords(address.scope, pin),
  };
}

const FACETS: Readonly<Record<AddressFacet, string>> = {
  value: '',
  lower: ', lower limit',
  upper: ', upper limit',
  pValue: ', p-value',
  statistic: ', statistic',
};

type QuantityWords = (terms: DesignTerms, pin: PinnedAnalysis, place: QuantityPlace) => string;

interface QuantityPlace {
  readonly address: ValueAddress;
  readonly phrasebook: Phrasebook;
}

const QUANTITIES: Readonly<Record<AddressedQuantity, QuantityWords>> = {
  events: (_terms, { result }) =>
    result.frame.design === 'caseControl' ? 'Cases' : 'Number with the outcome',
  total: () => 'Number in the group',
  risk: (terms, { result }) => terms[result.frame.outcome.desirability].head,
  riskDifference: measure('riskDifference'),
  riskRatio: measure('riskRatio'),
  oddsRatio: measure('oddsRatio'),
  numberNeeded: () => 'Number needed',
  test: (_terms, { result }) => testLabel(contrastTestId(result.specification)),
  pearson: () => 'Pearson chi-square test',
  fisher: () => 'Fisher’s exact test',
  association: () => 'Test over all levels',
  trend: () => 'Test for trend',
  conditionalIndependence: () => 'Cochran–Mantel–Haenszel test',
  'homogeneity:riskDifference': homogeneity('riskDifference'),
  'homogeneity:riskRatio': homogeneity('riskRatio'),
  'homogeneity:oddsRatio': homogeneity('oddsRatio'),
  'interaction:riskDifference': between('riskDifference', 'minus'),
  'interaction:riskRatio': between('riskRatio', 'over'),
  'interaction:oddsRatio': between('oddsRatio', 'over'),
  excessRisk: () => 'Relative excess risk due to interaction',
  fractionInExposed: (_terms, { result }, { address }) =>
    readsAsPrevented(result, address)
      ? 'Prevented fraction in the exposed, read as causal'
      : 'Attributable fraction in the exposed, read as causal',
  populationFraction: (_terms, { result }, { address }) =>
    readsAsPrevented(result, address)
      ? 'Prevented fraction in the population, read as causal'
      : 'Attributable fraction in the population, read as causal',
  eValue: (terms, _pin, { address }) =>
    address.facet === 'lower'
      ? `E-value of the ${terms.measures.riskRatio.name}’s limit nearer to 1`
      : `E-value of the ${terms.measures.riskRatio.name}`,
  counted: () => 'Records counted',
  leftOut: () => 'Records left out',
  controls: () => 'Controls',
  shareOfCases: () => 'Share of cases',
  shareOfControls: () => 'Share of controls',
  comparedCases: () => 'Cases compared',
  comparedControls: () => 'Controls compared',
  shareOfComparedCases: () => 'Share of cases compared',
  shareOfComparedControls: () => 'Share of controls compared',
  outsideEstimate: outside,
};

/** "Risk ratio, Kitchen over Hospital ward". */
function between(id: EffectMeasureId, direction: 'minus' | 'over'): QuantityWords {
  return (terms, { result }) => {
    const [first = '', second = ''] = result.frame.strata.map(({ label }) => label);
    return `${capitalised(terms.measures[id].name)}, ${second} ${direction} ${first}`;
  };
}

function readsAsPrevented(result: AnalysisResult, place: ValueAddress): boolean {
  const impact = fractionInExposedAt(result, place);
  return impact?.ok === true && impact.value.kind === 'prevented';
}

function testLabel(id: string | null): string {
  const register: Readonly<Record<string, MethodWords>> = TEST_METHODS;
  return register[id ?? '']?.label ?? 'Test';
}

function measure(id: EffectMeasureId): QuantityWords {
  return (terms) => capitalised(terms.measures[id].name);
}

function homogeneity(id: EffectMeasureId): QuantityWords {
  return (terms) => `Difference between strata, ${terms.measures[id].name}`;
}

/** "Adjusted odds ratio, computed elsewhere (logistic regression)". */
function outside(
  _terms: DesignTerms,
  pin: PinnedAnalysis,
  { address, phrasebook }: QuantityPlace,
): string {
  const estimate = pin.outside?.find(({ id }) => id === address.estimateId);
  if (estimate === undefined) return 'Estimate from elsewhere, removed';
  const name = outsideMeasureName(estimate.measure, pin, phrasebook);
  return `Adjusted ${name}, computed elsewhere (${estimate.method})`;
}

function groupWords({ levelId, quantity }: ValueAddress, { result }: PinnedAnalysis): string {
  const { label, levels, referenceLevelId } = result.frame.exposure;
  const labelOf = (id: string): string => levels.find((level) => level.id === id)?.label ?? id;
  if (levelId === null) return 'All levels';
  const level = `${label}: ${labelOf(levelId)}`;
  return COMPARES.includes(quantity) ? `${level} against ${labelOf(referenceLevelId)}` : level;
}

function scopeWords(scope: ResultScope, { result }: PinnedAnalysis): string {
  switch (scope.kind) {
    case 'crude':
      return result.frame.strata.length === 0 ? '' : 'All strata together';
    case 'pooled':
      return 'Pooled over strata';
    case 'stratum':
      return result.frame.strata.find(({ id }) => id === scope.stratumId)?.label ?? '';
  }
}

/** Numbers of a level that are about its difference from the reference. */
const COMPARES: readonly AddressedQuantity[] = [
  'riskDifference',
  'riskRatio',
  'oddsRatio',
  'numberNeeded',
  'test',
  'pearson',
  'fisher',
  'conditionalIndependence',
  'homogeneity:riskDifference',
  'homogeneity:riskRatio',
  'homogeneity:oddsRatio',
  'interaction:riskDifference',
  'interaction:riskRatio',
  'interaction:oddsRatio',
  'excessRisk',
  'fractionInExposed',
  'populationFraction',
  'eValue',
  'outsideEstimate',
];
