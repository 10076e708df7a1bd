import { type CodeBookColumn, FACTOR_SOURCE } from '#shared/code-book';
import { shownCode } from './column-words';
import type { LevelCounts } from './column-contents';

/** A level or band as a row of the editor. */
export interface LevelRow {
  readonly id: string;
  /** What it stands for in the file: codes, or the limits of a band. */
  readonly inFile: string;
  readonly label: string;
  readonly sentenceLabel: string;
  readonly count: number | null;
  /** Share of the largest level's count, 0..1. */
  readonly share: number;
  /** A colour of the charts, or null where there are too many levels for one each. */
  readonly ink: string | null;
  readonly isReference: boolean;
  readonly isMerged: boolean;
  readonly problem: string | null;
}

const LEVEL_INKS = 5;
const CATEGORY_INKS = 4;

/** The rows of a column's levels or bands, in print order. */
export function levelRows(column: CodeBookColumn, counts: LevelCounts): readonly LevelRow[] {
  const parts = FACTOR_SOURCE[column.kind] === 'bands' ? bandParts(column) : levelParts(column);
  return parts.map((part, at) => {
    const count = counts.ofLevel.get(part.id) ?? null;
    return {
      ...part,
      count,
      share: (count ?? 0) / counts.largest,
      ink: inkOf(column, at, parts.length),
      isReference: part.id === column.referenceLevelId,
      problem: problemOf(part),
    };
  });
}

type LevelPart = Pick<LevelRow, 'id' | 'inFile' | 'label' | 'sentenceLabel' | 'isMerged'>;

function levelParts(column: CodeBookColumn): readonly LevelPart[] {
  return column.levels.map(({ id, codes, label, sentenceLabel }) => ({
    id,
    inFile: codes.map(shownCode).join(', '),
    label,
    sentenceLabel,
    isMerged: codes.length > 1,
  }));
}

function bandParts(column: CodeBookColumn): readonly LevelPart[] {
  return column.bands.map(({ id, lower, upper, label, sentenceLabel }) => ({
    id,
    inFile: limitWords(lower, upper),
    label,
    sentenceLabel,
    isMerged: false,
  }));
}

function limitWords(lower: number | null, upper: number | null): string {
  if (lower === null) return `< ${String(upper ?? '')}`;
  return upper === null ? `≥ ${lower}` : `${lower} to < ${upper}`;
}

function inkOf(column: CodeBookColumn, at: number, levels: number): string | null {
  if (column.kind === 'category') {
    return levels <= CATEGORY_INKS ? `var(--ct${at + 1})` : null;
  }
  if (levels > LEVEL_INKS) return null;
  const step = levels === 1 ? 0 : Math.round((at * (LEVEL_INKS - 1)) / (levels - 1));
  return `var(--lv${step + 1})`;
}

function problemOf({ label, sentenceLabel }: LevelPart): string | null {
  if (label.trim() === '') return 'Give the level a label for tables.';
  return sentenceLabel.trim() === '' ? 'Give the level words for sentences.' : null;
}
