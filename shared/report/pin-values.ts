import { listValues } from '#shared/analysis';
import type { AddressedValue, AddressFacet, Quantity } from '#shared/analysis';
import { readOutsideNumbers, readPrintedPValue } from '#shared/outside-estimates';
import type { OutsideEstimate } from '#shared/outside-estimates';
import { outsideAddress } from '#shared/wording';
import type { PinnedAnalysis } from './report';

/**
 * Every number that a pinned analysis can show, each with its address: those of its result, then
 * the estimates from elsewhere beside it. Differences are shares of 1; a bound of p is no number.
 */
export function pinValues({
  analysisId,
  result,
  outside = [],
}: PinnedAnalysis): readonly AddressedValue[] {
  return [...listValues(result, analysisId), ...outside.flatMap(outsideValues)];
}

const PERCENT = 100;

function outsideValues(estimate: OutsideEstimate): readonly AddressedValue[] {
  const numbers = readOutsideNumbers(estimate);
  if (numbers === null) return [];
  const scale = estimate.measure === 'riskDifference' ? PERCENT : 1;
  const facets = (['value', 'lower', 'upper'] as const).map((facet) =>
    valueAt(estimate, facet, numbers[facet].value / scale),
  );
  return [...facets, ...pValueOf(estimate)];
}

function pValueOf(estimate: OutsideEstimate): readonly AddressedValue[] {
  const { pValue } = estimate;
  if (pValue === null || /[<>]/.test(pValue) || readPrintedPValue(pValue) === null) return [];
  return [valueAt(estimate, 'pValue', Number(pValue.replace(/[^\d.]/g, '')))];
}

function valueAt(estimate: OutsideEstimate, facet: AddressFacet, value: number): AddressedValue {
  const quantity: Quantity = { kind: 'real', value };
  return { address: outsideAddress(estimate, facet), quantity };
}
