import type { HouseStyle } from '#shared/house-style';
import type { GroupCount } from '#shared/stats';
import { formatNumber } from './format-number';
import { NO_BREAK_SPACE, type NumberText } from './number-text';
import { percentIsShown } from './percent-decimals';

/**
 * A group's share as a percentage without its sign, for columns whose head says "%".
 *
 * Null where the group is empty or so small that the house style shows counts only. `decimals` is
 * the analysis' `percent` of `decimalsOf`.
 */
export function formatShare(
  { events, total }: GroupCount,
  decimals: number,
  style: HouseStyle,
): NumberText | null {
  return percentIsShown(total, style.percent)
    ? formatNumber(
        { kind: 'fraction', numerator: events, denominator: total },
        { scale: 100, decimals, sign: 'minus' },
        style,
      )
    : null;
}

/**
 * What stands in place of a percentage for which a group is too small. Never the mark of a missing
 * cell: the share is there, it is only not printed.
 */
export function countsOnlyMark({ table }: HouseStyle): string {
  return table.missingCell.mark === '–' ? '…' : '–';
}

/** A limit of a share (0..1) as a percentage without its sign. */
export function formatShareLimit(limit: number, decimals: number, style: HouseStyle): NumberText {
  return formatNumber(
    { kind: 'real', value: limit },
    { scale: 100, decimals, sign: 'minus' },
    style,
  );
}

/** A figure with the house style's percent sign or word behind it: "12.5%". */
export function withPercentSign(figure: string, { percent }: HouseStyle): string {
  const signs = {
    closed: '%',
    spaced: `${NO_BREAK_SPACE}%`,
    word: NO_BREAK_SPACE + percent.word,
  };
  return figure + signs[percent.sign];
}
