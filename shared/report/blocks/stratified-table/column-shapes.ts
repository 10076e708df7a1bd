import type { TableColumn } from '#shared/layout';
import { fillWords } from '#shared/wording';
import type { PatternKey } from '#shared/wording';
import type { TableColumnId } from './table-plan';
import type { TableSetting } from './table-setting';

/** A column apart from its id and with a weight in place of its share of the width. */
export interface ColumnShape extends Pick<TableColumn, 'align' | 'parts'> {
  readonly weight: number;
}

/** The column of the levels, in the same measure as the weights of the others. */
export const LEVEL_COLUMN_WEIGHT = 16;

/** How a column stands in a table, and what numbers each of its cells holds. */
export function columnShape(id: TableColumnId, setting: TableSetting): ColumnShape {
  const { weight, parts } = SHAPES[id];
  return {
    weight,
    align: 'end',
    parts: parts.map((part) => ({ id: part, label: partLabel(part, id, setting) })),
  };
}

type PartId = 'events' | 'total' | 'value' | 'lower' | 'upper';

interface Shape {
  readonly weight: number;
  readonly parts: readonly PartId[];
}

const ESTIMATE: readonly PartId[] = ['value', 'lower', 'upper'];

const SHAPES: Readonly<Record<TableColumnId, Shape>> = {
  count: { weight: 10, parts: ['events', 'total'] },
  share: { weight: 8, parts: ['value'] },
  cases: { weight: 8, parts: ['value'] },
  casesShare: { weight: 8, parts: ['value'] },
  controls: { weight: 9, parts: ['value'] },
  controlsShare: { weight: 9, parts: ['value'] },
  riskDifference: { weight: 19, parts: ESTIMATE },
  riskRatio: { weight: 17, parts: ESTIMATE },
  oddsRatio: { weight: 17, parts: ESTIMATE },
  pValue: { weight: 8, parts: ['value'] },
};

/** A part's own word, or the column's head for the value itself. */
function partLabel(part: PartId, id: TableColumnId, setting: TableSetting): string {
  return part === 'value' ? setting.heads[id] : fillWords(setting.phrasebook, PART_WORDS[part], {});
}

const PART_WORDS = {
  events: 'part.events',
  total: 'part.total',
  lower: 'part.lower',
  upper: 'part.upper',
} as const satisfies Readonly<Record<Exclude<PartId, 'value'>, PatternKey>>;
