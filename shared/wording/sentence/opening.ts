import type { FactorLevel } from '#shared/code-book';
import { fillPattern, fillWords, joinParts } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import type { PhrasePart } from '../phrase';
import { poolingWords } from './pooling-words';
import type { WordingContext } from './wording-context';

/**
 * What a sentence says before its subject: that it is post hoc, in one stratum, adjusted for the
 * strata, or crude where there are strata.
 */
export function openingOf({ claim, book }: WordingContext): readonly PhrasePart[] {
  const postHoc = claim.planned === 'postHoc' ? fillPattern(book, 'opening.postHoc', {}) : [];
  const strata = claim.strataLabel;
  const { kind } = claim.scope;
  const adjustment =
    strata === null || kind === 'stratum'
      ? []
      : kind === 'pooled'
        ? fillPattern(book, 'opening.pooled', { strata, methods: poolingWords(claim, book) })
        : fillPattern(book, 'opening.crude', { strata });
  const within = claim.stratum
    ? fillPattern(book, 'opening.within', {
        within: withinWords(claim.stratum, claim.strataLabel ?? '', book),
      })
    : [];
  return joinParts([postHoc, adjustment, within]);
}

/** Where a stratum is, in words: "in kitchens", "in kitchens, among men". */
export function withinWords(stratum: FactorLevel, strataLabel: string, book: Phrasebook): string {
  const parts = stratum.within ?? [
    { columnLabel: strataLabel, levelLabel: stratum.sentenceLabel, pattern: null },
  ];
  const words = parts.map(({ columnLabel, levelLabel, pattern }) =>
    pattern?.includes('{level}')
      ? pattern.split('{level}').join(levelLabel)
      : fillWords(book, 'within.default', { column: columnLabel, level: levelLabel }),
  );
  return words.join(fillWords(book, 'within.join', {}));
}
