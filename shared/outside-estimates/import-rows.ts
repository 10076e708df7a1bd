import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { AnalysisResult } from '#shared/analysis';
import { checkNumbers } from './check-numbers';
import type { OutsideFinding } from './finding';
import { OUTSIDE_MEASURES } from './outside-estimate';
import type { OutsideEstimateEntry, OutsideMeasureId } from './outside-estimate';

/** A row of a file: its cells, and the line that it begins on. */
export interface ImportedRow {
  readonly line: number;
  readonly cells: readonly string[];
}

/** Why a row, or the header, can't be used; `facts` name what stands there. */
export interface ImportProblem {
  readonly line: number;
  readonly code: ImportProblemCode;
  readonly facts: Readonly<Record<string, string>>;
  /** Set for `numbersRefused`: what the checks found. */
  readonly findings?: readonly OutsideFinding[];
}

/** What can be wrong with a file of estimates. */
export type ImportProblemCode =
  | 'noRows'
  | 'tooManyRows'
  | 'columnMissing'
  | 'columnTwice'
  | 'columnUnknown'
  | 'levelUnknown'
  | 'levelIsReference'
  | 'measureUnknown'
  | 'cellEmpty'
  | 'cellTooLong'
  | 'numberNotWhole'
  | 'levelNotPercent'
  | 'dateNotReadable'
  | 'rowTwice'
  | 'numbersRefused';

/** Headers of a file of estimates, in plain words; case, blanks and order do not matter. */
export const IMPORT_COLUMNS = {
  level: ['level', 'exposure level'],
  measure: ['measure', 'effect measure'],
  value: ['estimate', 'value'],
  lower: ['lower', 'lower limit'],
  upper: ['upper', 'upper limit'],
  confidence: ['confidence', 'confidence level'],
  pValue: ['p', 'p-value', 'p value'],
  method: ['method', 'model'],
  covariates: ['covariates', 'adjusted for'],
  numberAnalysed: ['n', 'number analysed'],
  source: ['source', 'computed by'],
  computedOn: ['date', 'computed on'],
  note: ['note'],
} as const satisfies Readonly<Record<string, readonly string[]>>;

type Column = keyof typeof IMPORT_COLUMNS;

const NEEDED: readonly Column[] = [
  'level',
  'measure',
  'value',
  'lower',
  'upper',
  'method',
  'covariates',
  'source',
];

const MOST_ROWS = 200;
const MOST_CHARACTERS = 500;

/**
 * Reads the rows of a file, the header first, as estimates beside an analysis: all of them, or each
 * thing that is wrong with its line. Levels go by their labels, covariates are parted by ";".
 */
export function readImportedRows(
  rows: readonly ImportedRow[],
  { frame, specification }: Pick<AnalysisResult, 'frame' | 'specification'>,
): Result<readonly OutsideEstimateEntry[], readonly ImportProblem[]> {
  const [header, ...body] = rows;
  const line = header?.line ?? 1;
  if (header === undefined || body.length === 0) {
    return failure([{ line, code: 'noRows', facts: {} }]);
  }
  if (body.length > MOST_ROWS) {
    return failure([{ line, code: 'tooManyRows', facts: { most: String(MOST_ROWS) } }]);
  }
  const places = readHeader(header);
  if (!places.ok) {
    return places;
  }
  const read = body.map((row) =>
    readRow({ row, places: places.value }, frame, specification.level),
  );
  const problems = read.flatMap((one) => (one.ok ? [] : one.issue));
  const entries = read.flatMap((one) => (one.ok ? [one.value] : []));
  const repeated = problems.length > 0 ? [] : findRepeated(entries, body);
  const all = [...problems, ...repeated];
  return all.length > 0 ? failure(all) : success(entries);
}

type Places = ReadonlyMap<Column, number>;

function readHeader({ line, cells }: ImportedRow): Result<Places, readonly ImportProblem[]> {
  const places = new Map<Column, number>();
  const problems: ImportProblem[] = [];
  cells.forEach((cell, place) => {
    const column = columnOf(cell);
    if (column === undefined) {
      problems.push({ line, code: 'columnUnknown', facts: { column: cell.trim() } });
    } else if (places.has(column)) {
      problems.push({ line, code: 'columnTwice', facts: { column: cell.trim() } });
    } else {
      places.set(column, place);
    }
  });
  const missing = NEEDED.filter((column) => !places.has(column)).map((column) => ({
    line,
    code: 'columnMissing' as const,
    facts: { column: IMPORT_COLUMNS[column][0] },
  }));
  const all = [...problems, ...missing];
  return all.length > 0 ? failure(all) : success(places);
}

function columnOf(cell: string): Column | undefined {
  const name = plain(cell).replaceAll('_', ' ');
  const columns = Object.entries(IMPORT_COLUMNS) as [Column, readonly string[]][];
  return columns.find(([, names]) => names.includes(name))?.[0];
}

function plain(cell: string): string {
  return cell.trim().toLowerCase().replace(/\s+/g, ' ');
}

interface PlacedRow {
  readonly row: ImportedRow;
  readonly places: Places;
}

type Frame = AnalysisResult['frame'];

function readRow(
  placed: PlacedRow,
  frame: Frame,
  usualLevel: number,
): Result<OutsideEstimateEntry, readonly ImportProblem[]> {
  const text = (column: Column): string => cellAt(placed, column);
  const { levelId, measure, level, ...problems } = readWords(placed, frame, usualLevel);
  if (problems.found.length > 0 || measure === null || level === null || levelId === undefined) {
    return failure(problems.found);
  }
  const entry: OutsideEstimateEntry = {
    levelId,
    referenceLevelId: frame.exposure.referenceLevelId,
    measure,
    value: text('value'),
    lower: text('lower'),
    upper: text('upper'),
    level,
    pValue: orNull(text('pValue')),
    method: text('method'),
    covariates: text('covariates')
      .split(';')
      .map((one) => one.trim())
      .filter(Boolean),
    numberAnalysed: text('numberAnalysed') === '' ? null : wholeNumber(text('numberAnalysed')),
    source: text('source'),
    computedOn: orNull(text('computedOn')),
    note: orNull(text('note')),
  };
  const findings = checkNumbers(entry).filter(({ severity }) => severity === 'refusal');
  const refused = { line: placed.row.line, code: 'numbersRefused', facts: {}, findings } as const;
  return findings.length > 0 ? failure([refused]) : success(entry);
}

function cellAt({ row, places }: PlacedRow, column: Column): string {
  const place = places.get(column);
  return place === undefined ? '' : (row.cells[place] ?? '').trim();
}

function orNull(text: string): string | null {
  return text === '' ? null : text;
}

function wholeNumber(text: string): number | null {
  const digits = text.replace(/[ ,\u00a0\u202f]/g, '');
  return /^[1-9]\d{0,14}$/.test(digits) ? Number(digits) : null;
}

interface RowWords {
  readonly levelId: string | null | undefined;
  readonly measure: OutsideMeasureId | null;
  readonly level: number | null;
  readonly found: readonly ImportProblem[];
}

function readWords(placed: PlacedRow, frame: Frame, usualLevel: number): RowWords {
  const { line } = placed.row;
  const text = (column: Column): string => cellAt(placed, column);
  const problem = (code: ImportProblemCode, column: Column): ImportProblem => ({
    line,
    code,
    facts: { column: IMPORT_COLUMNS[column][0], text: text(column) },
  });
  const empty = NEEDED.filter((column) => column !== 'covariates' && text(column) === '');
  const long = [...placed.places.keys()].filter((column) => text(column).length > MOST_CHARACTERS);
  const levelId = levelOf(text('level'), frame);
  const measure = measureOf(text('measure'));
  const level = confidenceOf(text('confidence'), usualLevel);
  const number = text('numberAnalysed');
  const date = text('computedOn');
  const there = (column: Column): boolean => text(column) !== '';
  const isReference = levelId === frame.exposure.referenceLevelId;
  const found = [
    ...empty.map((column) => problem('cellEmpty', column)),
    ...long.map((column) => problem('cellTooLong', column)),
    ...(levelId === undefined && there('level') ? [problem('levelUnknown', 'level')] : []),
    ...(isReference ? [problem('levelIsReference', 'level')] : []),
    ...(measure === null && there('measure') ? [problem('measureUnknown', 'measure')] : []),
    ...(level === null ? [problem('levelNotPercent', 'confidence')] : []),
    ...(number !== '' && wholeNumber(number) === null
      ? [problem('numberNotWhole', 'numberAnalysed')]
      : []),
    ...(date !== '' && !isDay(date) ? [problem('dateNotReadable', 'computedOn')] : []),
  ];
  return { levelId, measure, level, found };
}

/** Undefined for a level that is not there, null for all levels together. */
function levelOf(text: string, { exposure }: Frame): string | null | undefined {
  const name = plain(text);
  if (ALL_LEVELS.includes(name)) {
    return null;
  }
  return exposure.levels.find(({ id, label }) => plain(label) === name || id === text)?.id;
}

const ALL_LEVELS: readonly string[] = ['all levels', 'all'];

function measureOf(text: string): OutsideMeasureId | null {
  const name = plain(text).replaceAll(/[ -]/g, '');
  return (
    OUTSIDE_MEASURES.find((id) => id.toLowerCase() === name || SHORT_NAMES[id].includes(name)) ??
    null
  );
}

const SHORT_NAMES: Readonly<Record<OutsideMeasureId, readonly string[]>> = {
  riskDifference: ['rd', 'prevalencedifference'],
  riskRatio: ['rr', 'relativerisk', 'prevalenceratio'],
  oddsRatio: ['or'],
  rateRatio: ['irr', 'incidencerateratio'],
  hazardRatio: ['hr'],
};

/** A share of 1 from "95", "95%" or "0.95"; the analysis' own where none is given. */
function confidenceOf(text: string, usualLevel: number): number | null {
  if (text === '') {
    return usualLevel;
  }
  const number = Number(text.replace(/\s*%$/, ''));
  const share = number > 1 ? number / 100 : number;
  return share > 0.5 && share < 1 ? share : null;
}

/** Whether a text is a day of the calendar, as in 2026-05-12. */
export function isDay(text: string): boolean {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(text)) {
    return false;
  }
  const date = new Date(`${text}T00:00:00Z`);
  return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(text);
}

function findRepeated(
  entries: readonly OutsideEstimateEntry[],
  body: readonly ImportedRow[],
): readonly ImportProblem[] {
  const seen = new Map<string, number>();
  return entries.flatMap((entry, place) => {
    const { levelId, measure, method, covariates } = entry;
    const key = JSON.stringify([levelId, measure, method, covariates]);
    const line = body[place]?.line ?? 0;
    const before = seen.get(key);
    seen.set(key, line);
    return before === undefined
      ? []
      : [{ line, code: 'rowTwice' as const, facts: { text: String(before) } }];
  });
}
