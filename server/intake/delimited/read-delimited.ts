import { failure, success, type Result } from '#shared/core';
import type { IntakeWarning } from '#shared/api';
import { EncodingWatch } from '../encode/encoding-watch';
import { TableEncoder } from '../encode/table-encoder';
import type { IntakeIssue } from '../intake-issue';
import type { ReadingContext, ReadingOutcome, ReadTable } from '../reading';
import type { SourceFile } from '../source-file';
import { delimitedForm, type DelimitedForm } from './delimited-bytes';
import { RowScanner } from './row-scanner';

/** Reads a delimited text file, chunk by chunk. */
export async function readDelimited(file: SourceFile, context: ReadingContext): ReadingOutcome {
  const { delimiter, encoding } = context.options;
  const form = delimitedForm(file.firstBytes, { delimiter, encoding });
  if (!form.ok) return form;
  const watch = new EncodingWatch(form.value.encoding);
  const table = new TableEncoder(watch, context.sink);
  const issue = await scanFile(file, form.value, table, context);
  if (issue !== null) return failure(issue);
  return settle(table, watch, form.value);
}

async function scanFile(
  file: SourceFile,
  form: DelimitedForm,
  table: TableEncoder,
  context: ReadingContext,
): Promise<IntakeIssue | null> {
  const scanner = new RowScanner(form.delimiterByte, table);
  for await (const chunk of file.chunks()) {
    const issue = scanner.push(form.convert(chunk)) ?? table.checkSize();
    if (issue !== null) return issue;
    await context.pause({ share: file.shareRead(), rows: table.rows });
  }
  const issue = scanner.push(form.convert(null)) ?? scanner.end();
  table.flush();
  return issue;
}

function settle(
  table: TableEncoder,
  watch: EncodingWatch,
  form: DelimitedForm,
): Result<ReadTable, IntakeIssue> {
  if (table.columns.length === 0) return failure({ code: 'emptyFile' });
  if (table.rows === 0) return failure({ code: 'headerOnly' });
  const encoding = watch.settle();
  if (!encoding.ok) return encoding;
  return success({
    table,
    encoding: encoding.value,
    delimiter: form.delimiter,
    sheet: null,
    sheets: [],
    warnings: form.fromUtf16 ? [CONVERTED] : [],
  });
}

const CONVERTED: IntakeWarning = {
  code: 'convertedFromUtf16',
  columnId: null,
  message: 'The file is UTF-16 and was read as such.',
};
