import type { HouseStyle } from '#shared/house-style';
import type { TableBodyCell } from '#shared/layout';
import { isSameModel } from '#shared/outside-estimates';
import type { OutsideEstimate } from '#shared/outside-estimates';
import { fillWords, outsideAddress, outsideName, outsideText } from '#shared/wording';
import type { OutsideColumn } from '#shared/wording';
import type { PinnedAnalysis } from '../../report';
import { fittingEstimates } from '../fitting-estimates';
import { wordsCell } from '../table-cells';
import { estimateCell, referenceCell } from './body-cell';
import type { ColumnShape } from './column-shapes';
import type { TableChoice } from './content';
import type { TableSetting } from './table-setting';

const COLUMN_WEIGHT = 17;
const PARTS = 3;

/**
 * The columns of estimates from elsewhere, one for each measure of each model, in the order of
 * entry; only those that compare what the rows compare.
 */
export function outsideColumns(
  { outside: isShown }: Pick<TableChoice, 'outside'>,
  { outside = [], result }: Pick<PinnedAnalysis, 'outside' | 'result'>,
): readonly OutsideColumn[] {
  if (isShown !== true) return [];
  const fitting = fittingEstimates(outside, result.frame);
  const firsts = fitting.filter(
    (one, place) => fitting.findIndex((other) => inOneColumn(one, other)) === place,
  );
  return firsts.map((first) => {
    const rivals = firsts.filter(({ measure }) => measure === first.measure);
    const number = rivals.length > 1 ? rivals.indexOf(first) + 1 : null;
    return { estimates: fitting.filter((one) => inOneColumn(one, first)), number };
  });
}

/** Whether a column has an estimate of a level, and not only of all levels together. */
export function hasLevels({ estimates }: OutsideColumn): boolean {
  return estimates.some(({ levelId }) => levelId !== null);
}

function inOneColumn(one: OutsideEstimate, other: OutsideEstimate): boolean {
  return one.measure === other.measure && isSameModel(one, other);
}

/** How a column of estimates from elsewhere stands in a table. */
export function outsideShape(column: OutsideColumn, setting: TableSetting): ColumnShape {
  const { houseStyle, phrasebook } = setting;
  const value = outsideName(column, setting, houseStyle, phrasebook);
  return {
    weight: COLUMN_WEIGHT,
    align: 'end',
    parts: [
      { id: 'value', label: value },
      { id: 'lower', label: fillWords(phrasebook, 'part.lower', {}) },
      { id: 'upper', label: fillWords(phrasebook, 'part.upper', {}) },
    ],
  };
}

/** A level's estimate in a column; nothing in a row that is about one stratum (null). */
export function outsideCell(
  { estimates }: OutsideColumn,
  levelId: string | null,
  setting: TableSetting,
): TableBodyCell {
  const [first] = estimates;
  if (levelId === null || first === undefined) {
    return wordsCell('', setting.blockId, { parts: PARTS });
  }
  if (levelId === setting.result.frame.exposure.referenceLevelId) {
    return referenceCell(first.measure, setting);
  }
  const estimate = estimates.find((one) => one.levelId === levelId);
  const printed = estimate ? outsideText(estimate, setting.houseStyle) : null;
  return estimate && printed
    ? estimateCell(printed, (facet) => outsideAddress(estimate, facet), setting)
    : wordsCell(missingMark(setting.houseStyle), setting.blockId, { parts: PARTS });
}

/** What stands where no estimate was computed; a word for "not estimable" would say too much. */
export function missingMark({ table }: HouseStyle): string {
  const { mark, meaning } = table.missingCell;
  return mark === meaning ? '–' : mark;
}

/** Whether a column lacks a level that is compared with the reference. */
export function lacksLevels({ outside, result }: TableSetting): boolean {
  const { levels, referenceLevelId } = result.frame.exposure;
  const compared = levels.filter(({ id }) => id !== referenceLevelId);
  return outside.some(({ estimates }) =>
    compared.some(({ id }) => !estimates.some(({ levelId }) => levelId === id)),
  );
}
