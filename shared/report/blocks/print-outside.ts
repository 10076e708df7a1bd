import type { ValueAddress } from '#shared/analysis';
import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { intervalLabel, joinLimits, limitBrackets } from '#shared/format';
import type { EstimateText } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import type { OutsideEstimate } from '#shared/outside-estimates';
import { fillWords, outsideAddress, outsidePValue, outsideText } from '#shared/wording';
import type { Phrasebook } from '#shared/wording';
import type { PinnedAnalysis } from '../report';
import type { BoundPart } from '../text/bound-text';
import type { BoundValueFormat } from '../text/text-document';

/** What the number is printed under. */
interface Under {
  readonly houseStyle: HouseStyle;
  readonly phrasebook: Phrasebook;
}

/** Prints a number of an estimate from elsewhere in running text, or says that it is gone. */
export function printOutside(
  { outside }: PinnedAnalysis,
  address: ValueAddress,
  format: BoundValueFormat,
  under: Under,
): Result<readonly BoundPart[], string> {
  const estimate = outside?.find(({ id }) => id === address.estimateId);
  const printed = estimate && outsideText(estimate, under.houseStyle);
  if (!estimate || !printed) return failure('the estimate from elsewhere is gone');
  const text = facetText(estimate, printed, address, under);
  const withLimits = format === 'withLimits' && address.facet === 'value';
  const limits = withLimits ? limitParts(estimate, printed, under) : [];
  return success([{ text, addresses: [address] }, ...limits]);
}

function facetText(
  estimate: OutsideEstimate,
  printed: EstimateText,
  { facet }: ValueAddress,
  { houseStyle, phrasebook }: Under,
): string {
  switch (facet) {
    case 'lower':
    case 'upper':
      return printed[facet].text;
    case 'pValue':
      return outsidePValue(estimate, houseStyle)?.text ?? houseStyle.table.missingCell.meaning;
    case 'statistic':
    case 'value':
      return estimate.measure === 'riskDifference'
        ? fillWords(phrasebook, `size.${houseStyle.difference.unit}`, { size: printed.value.text })
        : printed.value.text;
  }
}

function limitParts(
  estimate: OutsideEstimate,
  { lower, upper }: EstimateText,
  { houseStyle }: Under,
): readonly BoundPart[] {
  const { open, close } = limitBrackets('sentence', houseStyle);
  const label = intervalLabel(estimate.level, houseStyle) + houseStyle.interval.afterLabel;
  const addresses = [outsideAddress(estimate, 'lower'), outsideAddress(estimate, 'upper')];
  return [
    { text: ` (${label}${open}`, addresses: [] },
    { text: joinLimits(lower.text, upper.text, houseStyle), addresses },
    { text: `${close})`, addresses: [] },
  ];
}
