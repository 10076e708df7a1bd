import { isUtf8 } from 'node:buffer';
import { TextDecoder } from 'node:util';
import { failure, success, type Result } from '#shared/core';
import { delimitedForm } from './delimited/delimited-bytes';
import { RowScanner, type RowSink, type ScannedRow } from './delimited/row-scanner';
import type { IntakeIssue } from './intake-issue';

/** A row of a small table: its cells as text, and the line that it begins on. */
export interface SmallTableRow {
  readonly line: number;
  readonly cells: readonly string[];
}

/**
 * Reads a small delimited file whole, its header included; rows without any text are left out.
 *
 * Delimiter and encoding are found out as for a data cut. Fails as the reading of a cut does; cells
 * are not counted against the header's.
 */
export function readSmallTable(bytes: Uint8Array): Result<readonly SmallTableRow[], IntakeIssue> {
  const form = delimitedForm(bytes, { delimiter: null, encoding: null });
  if (!form.ok) return form;
  const { convert, delimiterByte, encoding } = form.value;
  const written = Buffer.concat([convert(bytes), convert(null)]);
  const decoder = new TextDecoder(encoding ?? (isUtf8(written) ? 'utf-8' : 'windows-1252'));
  const sink = new TextSink(decoder);
  const scanner = new RowScanner(delimiterByte, sink);
  const issue = scanner.push(written) ?? scanner.end();
  if (issue !== null) return failure(issue);
  return sink.rows.length === 0 ? failure({ code: 'emptyFile' }) : success(sink.rows);
}

/** Keeps the rows as text. */
class TextSink implements RowSink {
  readonly rows: SmallTableRow[] = [];

  constructor(private readonly decoder: TextDecoder) {}

  readonly add = (row: ScannedRow): null => {
    const cells = Array.from({ length: row.count }, (_, place) => this.cellAt(row, place));
    if (cells.some((cell) => cell.trim() !== '')) this.rows.push({ line: row.line, cells });
    return null;
  };

  readonly settle = (): null => null;

  private cellAt({ bytes, starts, ends }: ScannedRow, place: number): string {
    return this.decoder.decode(bytes.subarray(starts[place], ends[place]));
  }
}
