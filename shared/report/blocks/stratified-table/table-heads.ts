import type { ResultScope, ValueAddress } from '#shared/analysis';
import { EFFECT_MEASURES } from '#shared/effects';
import { formatCount } from '#shared/format';
import type { Run, TableHeadCell } from '#shared/layout';
import {
  fillPattern,
  fillWords,
  headWithInterval,
  outsideHead,
  strataWords,
} from '#shared/wording';
import { phraseRuns } from '../phrase-runs';
import { wordsRun } from '../table-cells';
import { countedLayer } from './counted-layer';
import type { TableColumnId, TablePlan } from './table-plan';
import type { TableSetting } from './table-setting';

/**
 * One row of heads, or two where a row of spanners stands over it: over layers side by side, and
 * over estimates from elsewhere, which are always named as such.
 */
export function headRows(
  plan: TablePlan,
  setting: TableSetting,
): readonly (readonly TableHeadCell[])[] {
  const level = headCell([wordsRun(setting.heads.level, setting.blockId)], 'start');
  const outside = outsideHeads(setting);
  const beside = plan.arrangement === 'sideBySide';
  const columns = beside
    ? plan.layers.flatMap((layer) => heads(layer.columns, setting))
    : heads(plan.layers[0]?.columns ?? [], setting);
  if (!beside && outside.spanners.length === 0) return [[level, ...columns]];
  const spanners = beside ? layerSpanners(plan, setting) : columns.map(overTwoRows);
  return [
    [overTwoRows(level), ...spanners, ...outside.spanners],
    [...(beside ? columns : []), ...outside.heads],
  ];
}

function heads(columns: readonly TableColumnId[], setting: TableSetting): readonly TableHeadCell[] {
  return columns.map((id) => {
    const marks = id === 'pValue' && setting.houseStyle.pValue.italic ? (['italic'] as const) : [];
    return headCell([wordsRun(headText(id, setting), setting.blockId, marks)], 'end');
  });
}

function layerSpanners(plan: TablePlan, setting: TableSetting): readonly TableHeadCell[] {
  return plan.layers.map(({ scope, columns }) => ({
    ...headCell(groupHead(scope, setting), 'center'),
    columnSpan: columns.length,
  }));
}

function outsideHeads({ outside, ...setting }: TableSetting): {
  readonly spanners: readonly TableHeadCell[];
  readonly heads: readonly TableHeadCell[];
} {
  const { houseStyle, phrasebook, blockId } = setting;
  if (outside.length === 0) return { spanners: [], heads: [] };
  const words = (text: string): readonly Run[] => [wordsRun(text, blockId)];
  const spanner = headCell(words(fillWords(phrasebook, 'outside.head', {})), 'center');
  return {
    spanners: [{ ...spanner, columnSpan: outside.length }],
    heads: outside.map((column) =>
      headCell(words(outsideHead(column, setting, houseStyle, phrasebook)), 'end'),
    ),
  };
}

function overTwoRows(cell: TableHeadCell): TableHeadCell {
  return { ...cell, rowSpan: 2 };
}

/** The head of a layer: a stratum with its N, all strata together, or the adjusted estimates. */
export function groupHead(scope: ResultScope, setting: TableSetting): readonly Run[] {
  const { result, phrasebook, blockId } = setting;
  const strata = strataWords(setting) ?? '';
  switch (scope.kind) {
    case 'stratum': {
      const stratum = result.frame.strata.find(({ id }) => id === scope.stratumId);
      return withSize(stratum?.label ?? scope.stratumId, scope, setting);
    }
    case 'crude':
      return withSize(fillWords(phrasebook, 'head.crude', {}), scope, setting);
    case 'pooled':
      return [wordsRun(fillWords(phrasebook, 'head.pooled', { strata }), blockId)];
  }
}

function withSize(label: string, scope: ResultScope, setting: TableSetting): readonly Run[] {
  const { analysisId, houseStyle, phrasebook, blockId, result } = setting;
  const { total } = countedLayer(result, scope).counts.total;
  const address: ValueAddress = {
    analysisId,
    quantity: 'total',
    levelId: null,
    scope,
    facet: 'value',
  };
  const count = { kind: 'value', text: formatCount(total, houseStyle).text, address } as const;
  const parts = fillPattern(phrasebook, 'title.size', { count });
  return [wordsRun(label, blockId), ...phraseRuns({ parts }, blockId)];
}

function headText(id: TableColumnId, setting: TableSetting): string {
  const { result, heads, houseStyle, phrasebook } = setting;
  const head = heads[id];
  const isEffect = Object.hasOwn(EFFECT_MEASURES, id);
  return isEffect
    ? headWithInterval(head, result.specification.level, houseStyle, phrasebook)
    : head;
}

function headCell(runs: readonly Run[], align: TableHeadCell['align']): TableHeadCell {
  return { runs, align, columnSpan: 1, rowSpan: 1 };
}
