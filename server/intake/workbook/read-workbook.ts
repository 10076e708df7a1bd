import { failure, success, type Result } from '#shared/core';
import type { IntakeWarning } from '#shared/api';
import { EncodingWatch } from '../encode/encoding-watch';
import { TableEncoder } from '../encode/table-encoder';
import type { IntakeIssue } from '../intake-issue';
import type { ReadingContext, ReadingOutcome, ReadTable } from '../reading';
import type { SourceFile } from '../source-file';
import { UnpackBudget } from './entry-bytes';
import { readSheet, type SheetReading } from './read-sheet';
import { ReadingStopped } from './reading-stopped';
import { openWorkbook, type OpenedWorkbook, type SheetPart } from './workbook-parts';
import { readZipDirectory } from './zip-entries';

/**
 * Reads one sheet of a workbook: the one that was chosen, else the first visible one that holds
 * anything.
 *
 * Unpacks and parses as it goes, within a budget of unpacked bytes; nothing is written to disk.
 */
export async function readWorkbook(file: SourceFile, context: ReadingContext): ReadingOutcome {
  await file.readThrough(() => context.pause({ share: 0, rows: 0 }));
  try {
    const archive = await readZipDirectory(file.handle, file.size);
    const budget = new UnpackBudget(file.size);
    const workbook = await openWorkbook(archive, budget, () =>
      context.pause({ share: budget.shareRead, rows: 0 }),
    );
    return await readSheets(workbook, context);
  } catch (problem) {
    if (problem instanceof ReadingStopped) return failure(problem.issue);
    throw problem;
  }
}

async function readSheets(workbook: OpenedWorkbook, context: ReadingContext): ReadingOutcome {
  const candidates = candidateSheets(workbook, context.options.sheet);
  if (!candidates.ok) return candidates;
  for (const sheet of candidates.value) {
    const table = new TableEncoder(new EncodingWatch('utf-8'), context.sink);
    const reading = await readSheet(workbook, sheet, table, context);
    if (table.columns.length > 0) return settle(workbook, sheet, table, reading);
  }
  return failure({ code: 'emptyWorkbook' });
}

function candidateSheets(
  { sheets }: OpenedWorkbook,
  chosen: string | null,
): Result<readonly SheetPart[], IntakeIssue> {
  if (chosen === null) return success(sheets.filter(({ hidden }) => !hidden));
  const sheet = sheets.find(({ name }) => name === chosen);
  if (sheet !== undefined) return success([sheet]);
  const names = sheets.map(({ name }) => `"${name}"`).join(', ');
  return failure({ code: 'noSuchSheet', facts: { sheet: chosen, sheets: names } });
}

function settle(
  workbook: OpenedWorkbook,
  sheet: SheetPart,
  table: TableEncoder,
  { notes, headerRow }: SheetReading,
): Result<ReadTable, IntakeIssue> {
  if (table.rows === 0) return failure({ code: 'headerOnly' });
  return success({
    table,
    encoding: 'utf-8',
    delimiter: null,
    sheet: sheet.name,
    sheets: workbook.sheets.map(({ name }) => name),
    warnings: [...otherSheets(workbook, sheet), ...notes.warnings(headerRow)],
  });
}

function otherSheets({ sheets }: OpenedWorkbook, read: SheetPart): readonly IntakeWarning[] {
  const others = sheets.filter((sheet) => sheet !== read).map(({ name }) => `"${name}"`);
  if (others.length === 0) return [];
  const message = `The sheet "${read.name}" was read. The workbook also has ${others.join(', ')}.`;
  return [{ code: 'otherSheets', columnId: null, message }];
}
