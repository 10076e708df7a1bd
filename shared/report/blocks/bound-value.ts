import { parseAddress } from '#shared/analysis';
import { markAbbreviations } from '../compose/abbreviations';
import type { BoundPart, BoundText } from '../text/bound-text';
import type { BoundValueFormat } from '../text/text-document';
import type { BlockContext } from './block-context';
import { printOutside } from './print-outside';
import { printValue } from './print-value';

/** What a bound value prints in running text, or in words why it can't. */
export function boundText(
  addressKey: string,
  format: BoundValueFormat,
  context: Pick<BlockContext, 'pins' | 'houseStyle' | 'phrasebook'>,
): BoundText {
  const address = parseAddress(addressKey);
  if (!address.ok) return missing('a value that can’t be read');
  const pinned = context.pins.get(address.value.analysisId);
  if (pinned === undefined) return missing('value of an analysis that is gone');
  const printed =
    address.value.quantity === 'outsideEstimate'
      ? printOutside(pinned, address.value, format, context)
      : printValue(pinned.result, address.value, format, context);
  return printed.ok
    ? { state: 'bound', parts: printed.value.flatMap((part) => abbreviated(part, context)) }
    : missing(`value missing: ${printed.issue}`);
}

function abbreviated(
  part: BoundPart,
  { phrasebook }: Pick<BlockContext, 'phrasebook'>,
): readonly BoundPart[] {
  return part.addresses.length === 0 ? markAbbreviations(part, phrasebook) : [part];
}

function missing(words: string): BoundText {
  return { state: 'missing', parts: [{ text: `[${words}]`, addresses: [] }] };
}
