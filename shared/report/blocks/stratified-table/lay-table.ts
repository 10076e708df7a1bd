import type { FactorLevel } from '#shared/code-book';
import type { TableBodyCell, TableColumn, TableElement, TableRow } from '#shared/layout';
import { wordsCell } from '../table-cells';
import { bodyCell } from './body-cell';
import { countedLayer } from './counted-layer';
import { columnShape, LEVEL_COLUMN_WEIGHT } from './column-shapes';
import { outsideCell, outsideShape } from './outside-columns';
import { groupHead, headRows } from './table-heads';
import type { TableColumnId, TableLayer, TablePlan } from './table-plan';
import type { TableSetting } from './table-setting';

/** The columns, heads and rows of a planned table. */
export function layTable(
  plan: TablePlan,
  setting: TableSetting,
): Pick<TableElement, 'columns' | 'head' | 'rows'> {
  return {
    columns: columnsOf(plan, setting),
    head: headRows(plan, setting),
    rows: plan.arrangement === 'stacked' ? stackedRows(plan, setting) : levelRows(plan, setting),
  };
}

/** The layers that stand beside each other; stacked ones share the columns of the first. */
function layersAcross(plan: TablePlan): readonly TableLayer[] {
  return plan.arrangement === 'stacked' ? plan.layers.slice(0, 1) : plan.layers;
}

function columnsOf(plan: TablePlan, setting: TableSetting): readonly TableColumn[] {
  const across = layersAcross(plan).flatMap((layer, index) =>
    layer.columns.map((id) => ({ id: `${String(index)}.${id}`, ...columnShape(id, setting) })),
  );
  const outside = setting.outside.map((column, index) => ({
    id: `outside.${String(index)}`,
    ...outsideShape(column, setting),
  }));
  const level = { id: 'level', weight: LEVEL_COLUMN_WEIGHT, align: 'start' as const, parts: [] };
  const columns = [level, ...across, ...outside];
  const total = columns.reduce((sum, { weight }) => sum + weight, 0);
  return columns.map(({ weight, ...column }) => ({ ...column, width: weight / total }));
}

function levelRows(plan: TablePlan, setting: TableSetting): readonly TableRow[] {
  return setting.result.frame.exposure.levels.map((level) =>
    withOutside(levelRow(level, plan.layers, 0, setting), level.id, setting),
  );
}

function stackedRows(plan: TablePlan, setting: TableSetting): readonly TableRow[] {
  const { levels } = setting.result.frame.exposure;
  return plan.layers.flatMap((layer): readonly TableRow[] => [
    {
      kind: 'group',
      indent: 0,
      cells: [{ runs: groupHead(layer.scope, setting), numbers: [] }],
    },
    ...levels.map((level) =>
      withOutside(
        levelRow(level, [layer], 1, setting),
        layer.scope.kind === 'crude' ? level.id : null,
        setting,
      ),
    ),
  ]);
}

function levelRow(
  level: FactorLevel,
  layers: readonly TableLayer[],
  indent: TableRow['indent'],
  setting: TableSetting,
): TableRow {
  const head = wordsCell(level.label, setting.blockId, { parts: 0 });
  const cells = layers.flatMap(({ scope, columns }): readonly TableBodyCell[] => {
    const layer = countedLayer(setting.result, scope);
    return columns.map((id: TableColumnId) => bodyCell(id, layer, level.id, setting));
  });
  return { kind: 'level', indent, cells: [head, ...cells] };
}

/** A row with its estimates from elsewhere; empty cells where it is not one of the crude rows. */
function withOutside(row: TableRow, levelId: string | null, setting: TableSetting): TableRow {
  const cells = setting.outside.map((column) => outsideCell(column, levelId, setting));
  return cells.length === 0 ? row : { ...row, cells: [...row.cells, ...cells] };
}
