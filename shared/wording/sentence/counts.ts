import { formatCount, formatShare, withPercentSign } from '#shared/format';
import type { GroupCount } from '#shared/stats';
import type { AddressedQuantity, ValueAddress } from '#shared/analysis';
import type { ClaimGroup } from '../claim';
import { fillPattern } from '../phrasebook/fill-pattern';
import type { PhrasePart } from '../phrase';
import { countAddress, type WordingContext } from './wording-context';

/** "34 of 163, 20.9%", for use inside brackets. */
export function countInBrackets(context: WordingContext, group: ClaimGroup): readonly PhrasePart[] {
  const count = groupCount(context, group);
  const share = groupShare(context, group);
  const comma = context.style.numbers.decimalMark === ',' ? ';' : ',';
  return share ? fillPattern(context.book, 'count.withShare', { count, comma, share }) : count;
}

/** "34 of 163 (20.9%)", for use in running words. */
export function countInText(context: WordingContext, group: ClaimGroup): readonly PhrasePart[] {
  const count = groupCount(context, group);
  const share = groupShare(context, group);
  return share ? fillPattern(context.book, 'count.inText', { count, share }) : count;
}

/** "34 of 163" or "34/163", from any two counts. */
export function countOf(
  { style, book }: WordingContext,
  { events, total }: GroupCount,
  addresses: { readonly events: ValueAddress; readonly total: ValueAddress },
): readonly PhrasePart[] {
  const part = (count: number, address: ValueAddress): PhrasePart => ({
    kind: 'value',
    text: formatCount(count, style).text,
    address,
  });
  return fillPattern(book, `count.${style.sentence.groupCount}`, {
    events: part(events, addresses.events),
    total: part(total, addresses.total),
  });
}

/** "20.9%" as a bound part; null where the group is too small for a percentage. */
export function shareOf(
  { style, decimals }: WordingContext,
  count: GroupCount,
  address: ValueAddress,
): PhrasePart | null {
  const share = formatShare(count, decimals.percent, style);
  return share && { kind: 'value', text: withPercentSign(share.text, style), address };
}

function groupCount(context: WordingContext, { count, level }: ClaimGroup): readonly PhrasePart[] {
  const at = (quantity: AddressedQuantity): ValueAddress =>
    countAddress(context, quantity, level.id);
  return countOf(context, count, { events: at('events'), total: at('total') });
}

function groupShare(context: WordingContext, { count, level }: ClaimGroup): PhrasePart | null {
  return shareOf(context, count, countAddress(context, 'risk', level.id));
}
