import { addressKey, type ValueAddress } from '#shared/analysis';
import { pinValues, valueWords, type PinnedAnalysis, type ValueWords } from '#shared/report';
import type { Phrasebook } from '#shared/wording';

/** A value to choose: in words, and as it prints. */
export interface ListedValue extends ValueWords {
  readonly key: string;
  readonly address: ValueAddress;
  readonly text: string;
  /** Of whom and where, in one line. */
  readonly place: string;
}

/** How many values are shown at once; searching narrows them down. */
export const MOST_SHOWN = 60;

/** Every value of an analysis, with its words and its print. */
export function listedValues(
  pin: PinnedAnalysis,
  phrasebook: Phrasebook,
  textOf: (address: ValueAddress) => string,
): readonly ListedValue[] {
  return pinValues(pin).map(({ address }) => {
    const words = valueWords(address, pin, phrasebook);
    const place = [words.whom, words.where].filter(Boolean).join(', ');
    return { ...words, place, key: addressKey(address), address, text: textOf(address) };
  });
}

/** The values whose words or print hold every word that was typed, in any order. */
export function found(values: readonly ListedValue[], search: string): readonly ListedValue[] {
  const wanted = plain(search).split(' ').filter(Boolean);
  if (wanted.length === 0) return values;
  return values.filter(({ what, place, text }) => {
    const words = plain(`${what} ${place} ${text}`);
    return wanted.every((word) => words.includes(word));
  });
}

function plain(text: string): string {
  return text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[\u2012-\u2015\u2212]/gu, '-')
    .toLowerCase();
}
