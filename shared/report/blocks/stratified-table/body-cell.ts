import type { AddressedQuantity, AddressFacet, Quantity, ValueAddress } from '#shared/analysis';
import { contrastTable } from '#shared/analysis';
import { EFFECT_MEASURES } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import {
  countsOnlyMark,
  formatCount,
  formatEstimate,
  formatPValue,
  formatShare,
  joinLimits,
  limitBrackets,
} from '#shared/format';
import type { EstimateText, NumberText } from '#shared/format';
import type { TableBodyCell } from '#shared/layout';
import type { OutsideMeasureId } from '#shared/outside-estimates';
import type { Estimate, GroupCount } from '#shared/stats';
import { cellNumber, numbersRun, wordsCell, wordsRun } from '../table-cells';
import type { CountedLayer } from './counted-layer';
import { pValueAt } from './p-values';
import type { TableColumnId } from './table-plan';
import type { TableSetting } from './table-setting';

/** One cell of a layer: what a column prints for an exposure level. */
export function bodyCell(
  column: TableColumnId,
  layer: CountedLayer,
  levelId: string,
  setting: TableSetting,
): TableBodyCell {
  return CELLS[column](layer, levelId, setting);
}

type CellMaker = (layer: CountedLayer, levelId: string, setting: TableSetting) => TableBodyCell;

const CELLS: Readonly<Record<TableColumnId, CellMaker>> = {
  count: groupCountCell,
  share: (layer, levelId, setting) =>
    shareCell(countOf(layer, levelId), addressIn(layer, levelId, 'risk', setting), setting),
  cases: (layer, levelId, setting) =>
    countCell(casesOf(layer, levelId), addressIn(layer, levelId, 'events', setting), setting),
  casesShare: (layer, levelId, setting) =>
    shareCell(casesOf(layer, levelId), addressIn(layer, levelId, 'shareOfCases', setting), setting),
  controls: (layer, levelId, setting) =>
    countCell(controlsOf(layer, levelId), addressIn(layer, levelId, 'controls', setting), setting),
  controlsShare: (layer, levelId, setting) =>
    shareCell(
      controlsOf(layer, levelId),
      addressIn(layer, levelId, 'shareOfControls', setting),
      setting,
    ),
  riskDifference: (...parts) => effectCell('riskDifference', ...parts),
  riskRatio: (...parts) => effectCell('riskRatio', ...parts),
  oddsRatio: (...parts) => effectCell('oddsRatio', ...parts),
  pValue: pValueCell,
};

function groupCountCell(
  layer: CountedLayer,
  levelId: string,
  setting: TableSetting,
): TableBodyCell {
  const { events, total } = countOf(layer, levelId);
  const { houseStyle } = setting;
  const numbers = [
    cellNumber(formatCount(events, houseStyle), addressIn(layer, levelId, 'events', setting)),
    cellNumber(formatCount(total, houseStyle), addressIn(layer, levelId, 'total', setting)),
  ];
  return numbersCell(numbers.map(({ text }) => text).join('/'), numbers, setting);
}

function countCell(
  { events }: GroupCount,
  address: ValueAddress,
  setting: TableSetting,
): TableBodyCell {
  const number = cellNumber(formatCount(events, setting.houseStyle), address);
  return numbersCell(number.text, [number], setting);
}

function shareCell(count: GroupCount, address: ValueAddress, setting: TableSetting): TableBodyCell {
  const share = formatShare(count, setting.decimals.percent, setting.houseStyle);
  if (share === null) return withoutShare(count, setting);
  return numbersCell(share.text, [cellNumber(share, address)], setting);
}

function withoutShare({ total }: GroupCount, setting: TableSetting): TableBodyCell {
  if (total === 0) return missingCell(1, setting);
  return wordsCell(countsOnlyMark(setting.houseStyle), setting.blockId, { parts: 1 });
}

/** The cases at a level among all cases of the layer. */
function casesOf(layer: CountedLayer, levelId: string): GroupCount {
  return { events: countOf(layer, levelId).events, total: layer.counts.total.events };
}

/** The controls at a level among all controls of the layer. */
function controlsOf(layer: CountedLayer, levelId: string): GroupCount {
  const { events, total } = countOf(layer, levelId);
  const all = layer.counts.total;
  return { events: total - events, total: all.total - all.events };
}

function effectCell(
  measure: EffectMeasureId,
  layer: CountedLayer,
  levelId: string,
  setting: TableSetting,
): TableBodyCell {
  if (levelId === setting.result.frame.exposure.referenceLevelId) {
    return referenceCell(measure, setting);
  }
  const contrast = layer.contrasts.find(({ indexLevelId }) => indexLevelId === levelId);
  const estimate = contrast?.measures[measure];
  if (estimate?.ok !== true) return missingCell(3, setting);
  const exact = exactOf(measure, layer, levelId, estimate.value);
  const { decimals, houseStyle } = setting;
  const printed = formatEstimate(
    measure,
    { estimate: estimate.value, exact },
    decimals,
    houseStyle,
  );
  const address = (facet: AddressFacet): ValueAddress =>
    addressIn(layer, levelId, measure, setting, facet);
  return estimateCell(printed, address, setting);
}

/** An estimate with its limits, each number bound to its place. */
export function estimateCell(
  printed: EstimateText,
  address: (facet: AddressFacet) => ValueAddress,
  setting: TableSetting,
): TableBodyCell {
  const { blockId, houseStyle } = setting;
  const { open, close } = limitBrackets('table', houseStyle);
  const limits = joinLimits(printed.lower.text, printed.upper.text, houseStyle);
  const facets = [address('lower'), address('upper')];
  return {
    runs: [
      numbersRun(printed.value.text, blockId, [address('value')]),
      wordsRun(' ', blockId),
      numbersRun(open + limits + close, blockId, facets, ['secondary']),
    ],
    numbers: (['value', 'lower', 'upper'] as const).map((facet) =>
      cellNumber(printed[facet], address(facet)),
    ),
  };
}

function pValueCell(layer: CountedLayer, levelId: string, setting: TableSetting): TableBodyCell {
  const { result, blockId, houseStyle, pValues } = setting;
  if (levelId === result.frame.exposure.referenceLevelId) {
    return wordsCell('', blockId, { parts: 1 });
  }
  const placed = pValues && pValueAt(pValues, layer.scope, levelId);
  if (!placed) return missingCell(1, setting);
  const { text, number } = formatPValue(placed.pValue, result.specification.level, houseStyle);
  const address = addressIn(layer, levelId, placed.quantity, setting, 'pValue');
  return {
    runs: [numbersRun(text, blockId, [address])],
    numbers: [number && cellNumber(number, address)],
  };
}

/** What a cell of the reference level prints: 0 for a difference, 1 for a ratio. */
export function referenceCell(
  measure: EffectMeasureId | OutsideMeasureId,
  setting: TableSetting,
): TableBodyCell {
  const { referenceDifference, referenceRatio } = setting.houseStyle.table;
  const text = measure === 'riskDifference' ? referenceDifference : referenceRatio;
  return wordsCell(text, setting.blockId, { parts: 3, marks: ['secondary'] });
}

function missingCell(parts: number, { houseStyle, blockId }: TableSetting): TableBodyCell {
  return wordsCell(houseStyle.table.missingCell.mark, blockId, { parts });
}

function numbersCell(
  text: string,
  numbers: readonly (NumberText & { readonly address: ValueAddress })[],
  { blockId }: TableSetting,
): TableBodyCell {
  const addresses = numbers.map(({ address }) => address);
  return { runs: [numbersRun(text, blockId, addresses)], numbers };
}

/** Pooled estimates are sums over strata: no single fraction stands behind them. */
function exactOf(
  measure: EffectMeasureId,
  layer: CountedLayer,
  levelId: string,
  { interval }: Estimate,
): Quantity | null {
  if (layer.scope.kind === 'pooled') return null;
  const table = contrastTable(layer.counts, levelId);
  const fraction =
    table === undefined ? null : EFFECT_MEASURES[measure].fraction(table, interval.method);
  return fraction && { kind: 'fraction', ...fraction };
}

function countOf({ counts }: CountedLayer, levelId: string): GroupCount {
  const level = counts.levels.find((one) => one.levelId === levelId);
  return level?.count ?? { events: 0, total: 0 };
}

/** Counts beside pooled estimates are those of all records. */
function addressIn(
  { scope }: CountedLayer,
  levelId: string,
  quantity: AddressedQuantity,
  { analysisId }: TableSetting,
  facet: AddressFacet = 'value',
): ValueAddress {
  const isEffect = Object.hasOwn(EFFECT_MEASURES, quantity);
  const place = scope.kind === 'pooled' && !isEffect ? ({ kind: 'crude' } as const) : scope;
  return { analysisId, quantity, levelId, scope: place, facet };
}
