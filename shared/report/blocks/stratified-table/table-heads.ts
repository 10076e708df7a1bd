import type { ResultScope, ValueAddress } from '#shared/analysis';
import { EFFECT_MEASURES } from '#shared/effects';
import { formatCount } from '#shared/format';
import type { Run, TableHeadCell } from '#shared/layout';
import { fillPattern, fillWords, headWithInterval, strataWords } from '#shared/wording';
import { phraseRuns } from '../phrase-runs';
import { wordsRun } from '../table-cells';
import { countedLayer } from './counted-layer';
import type { TableColumnId, TablePlan } from './table-plan';
import type { TableSetting } from './table-setting';

/** One row of heads, or a row of spanners over it where layers stand side by side. */
export function headRows(
  plan: TablePlan,
  setting: TableSetting,
): readonly (readonly TableHeadCell[])[] {
  const heads = (columns: readonly TableColumnId[]): readonly TableHeadCell[] =>
    columns.map((id) => headCell([wordsRun(headText(id, setting), setting.blockId)], 'end'));
  const levelRuns = [wordsRun(setting.heads.level, setting.blockId)];
  if (plan.arrangement !== 'sideBySide') {
    return [[headCell(levelRuns, 'start'), ...heads(plan.layers[0]?.columns ?? [])]];
  }
  const spanners = plan.layers.map(({ scope, columns }) => ({
    ...headCell(groupHead(scope, setting), 'center'),
    columnSpan: columns.length,
  }));
  return [
    [{ ...headCell(levelRuns, 'start'), rowSpan: 2 }, ...spanners],
    plan.layers.flatMap(({ columns }) => heads(columns)),
  ];
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
