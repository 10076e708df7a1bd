import type { IntakeWarning } from '#shared/api';
import { lettersOfColumn, rowOfReference } from './cell-reference';

/** Gathers what is odd in a sheet while it is read. */
export class SheetNotes {
  private errors = 0;
  private firstError = '';
  private unvalued = 0;
  private hiddenRows = 0;
  private outside = 0;
  private firstOutside = '';
  private goesOnAt: number | null = null;
  private merged: string[] = [];

  errorCell(reference: string, text: string): void {
    if (this.errors === 0) this.firstError = `${text} in ${reference}`;
    this.errors += 1;
  }

  formulaWithoutValue(): void {
    this.unvalued += 1;
  }

  hiddenRow(): void {
    this.hiddenRows += 1;
  }

  cellOutside(column: number, row: number): void {
    if (this.outside === 0) this.firstOutside = `${lettersOfColumn(column)}${String(row)}`;
    this.outside += 1;
  }

  /** The table goes on in this row after one or more blank rows. */
  goesOnAfterGap(row: number): void {
    this.goesOnAt ??= row;
  }

  mergedCells(reference: string): void {
    this.merged.push(reference);
  }

  /** All of it as warnings; `headerRow` tells merged titles above the table from merged data. */
  warnings(headerRow: number): readonly IntakeWarning[] {
    return [
      ...this.severalTables(),
      ...this.mergedWarning(headerRow),
      ...when(
        this.errors,
        'errorCells',
        (count) =>
          `${cells(count)} with an error, the first being ${this.firstError}; ` +
          "read as the error's name.",
      ),
      ...when(
        this.unvalued,
        'formulaWithoutValue',
        (count) =>
          `${cells(count)} with a formula without a stored result; read as blank. ` +
          'Open the workbook, save it, and load it again.',
      ),
      ...when(
        this.hiddenRows,
        'hiddenRows',
        (count) =>
          `${count === 1 ? '1 hidden row' : `${String(count)} hidden rows`} of the sheet, ` +
          'read like the others.',
      ),
    ];
  }

  private severalTables(): readonly IntakeWarning[] {
    const beside = when(
      this.outside,
      'severalTables',
      (count) =>
        `${cells(count)} outside the columns of the first table, the first being ` +
        `${this.firstOutside}; left out. Keep one table in a sheet.`,
    );
    const row = this.goesOnAt;
    const below = when(
      row ?? 0,
      'severalTables',
      () =>
        `The sheet goes on in row ${String(row)} after a blank row. ` +
        'If that is another table, move it to a sheet of its own.',
    );
    return [...beside, ...below];
  }

  private mergedWarning(headerRow: number): readonly IntakeWarning[] {
    const within = this.merged.filter((reference) => rowOfReference(reference) > headerRow);
    return when(
      within.length,
      'mergedCells',
      (count) =>
        `${count === 1 ? '1 group' : `${String(count)} groups`} of merged cells, the first being ` +
        `${within[0] ?? ''}; all but the first cell of a group are blank.`,
    );
  }
}

function cells(count: number): string {
  return count === 1 ? '1 cell' : `${String(count)} cells`;
}

function when(
  count: number,
  code: string,
  words: (count: number) => string,
): readonly IntakeWarning[] {
  return count === 0 ? [] : [{ code, columnId: null, message: words(count) }];
}
