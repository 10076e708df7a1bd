import { setImmediate as turn } from 'node:timers/promises';
import { countColumnIds, factorLevels, type CodeBook } from '#shared/code-book';
import type { Result } from '#shared/core';
import {
  checkCounts,
  createTallyCounter,
  type EncodedColumn,
  type EncodedCut,
  type Tally,
  type TallyIssue,
  type TallyRequest,
} from '#shared/tally';
import type { Database } from '../models/database';
import { timestamp, type Clock } from '../runtime/clock';
import type { CountingEngine } from './counting-engine';
import { readRecords } from './read-records';
import { createResidentCuts, type CutOutline, type ResidentCuts } from './resident-cuts';
import { inCodeBookOrder, tallyKey } from './tally-key';

/** What the engine stands on. */
export interface CountingSurroundings {
  readonly database: Database;
  readonly clock: Clock;
  /** Bytes of columns that stay in memory. */
  readonly residentBytes: number;
}

/** Counts cuts whose columns lie in the database of this server. */
export function createCountingEngine(surroundings: CountingSurroundings): CountingEngine {
  const { database, residentBytes } = surroundings;
  const resident = createResidentCuts(database.stores, residentBytes);
  return {
    count: async (cutId, codeBook, request) => {
      const key = tallyKey(cutId, codeBook, request);
      const kept = await database.stores.tallies.find(key);
      if (kept !== null) return { ok: true, value: inOrderOf(codeBook, kept) };
      const counted = await countCut(resident, cutId, codeBook, request);
      if (counted.ok) await keep(surroundings, key, cutId, counted.value);
      return counted;
    },
    checkCounts: async (cutId, codeBook) => {
      const outline = await resident.presentOutline(cutId);
      const cut = await loadCut(resident, outline, countColumnIds(codeBook.layout));
      return checkCounts(cut, codeBook);
    },
    records: (cutId, window) => readRecords(resident, cutId, window),
  };
}

/** Rows between which others get their turn; some hundredths of a second. */
const ROWS_AT_A_TIME = 1 << 21;

async function countCut(
  resident: ResidentCuts,
  cutId: string,
  codeBook: CodeBook,
  request: TallyRequest,
): Promise<Result<Tally, TallyIssue>> {
  const restricting = request.restrictions.map(({ columnId }) => columnId);
  const needed = [...request.columnIds, ...restricting, ...countColumnIds(codeBook.layout)];
  const cut = await loadCut(resident, await resident.outline(cutId), needed);
  const counter = createTallyCounter(cut, codeBook, request);
  if (!counter.ok) return counter;
  for (let from = 0; from < cut.rows; from += ROWS_AT_A_TIME) {
    if (from > 0) await turn();
    counter.value.add(from, Math.min(cut.rows, from + ROWS_AT_A_TIME));
  }
  return counter.value.finish();
}

async function loadCut(
  resident: ResidentCuts,
  outline: CutOutline,
  columnIds: readonly string[],
): Promise<EncodedCut> {
  const wanted = outline.columns.filter(({ columnId }) => columnIds.includes(columnId));
  const columns = new Map<string, EncodedColumn>();
  for (const column of wanted) columns.set(column.columnId, await resident.column(outline, column));
  return { rows: outline.rows, decimalMark: outline.decimalMark, columns };
}

async function keep(
  { database, clock }: CountingSurroundings,
  hash: string,
  cutId: string,
  content: Tally,
): Promise<void> {
  const tally = { hash, cutId, content, createdAt: timestamp(clock) };
  await database.unitOfWork('site', (unit) => database.stores.tallies.insert(tally, unit));
}

function inOrderOf({ columns }: CodeBook, tally: Tally): Tally {
  const axes = tally.axes.map(({ columnId }) => {
    const column = columns.find(({ id }) => id === columnId);
    const levels = column === undefined ? [] : factorLevels(column);
    return { columnId, levelIds: levels.map(({ id }) => id) };
  });
  return inCodeBookOrder(tally, axes);
}
