import { expect } from '@playwright/test';
import type { ReportPage } from '../pages/report-page';
import {
  expectSameDocument,
  expectSameWorkbook,
  printedNumbers,
  sheetOf,
} from '../readers/agreement';
import { readDocx, type ReadDocument } from '../readers/docx';
import { numbersIn } from '../readers/numbers';
import type { PrintedBlock } from '../readers/proof';
import { readXlsx, type ReadWorkbook } from '../readers/xlsx';

/** A report as the proof prints it and as its files hold it. */
export interface CheckedExports {
  readonly printed: readonly PrintedBlock[];
  readonly document: ReadDocument;
  readonly workbook: ReadWorkbook;
  /** Every value of the workbook at full precision. */
  readonly values: readonly number[];
}

/** Downloads a report in both formats and holds the files to the proof. */
export async function checkedExports(report: ReportPage): Promise<CheckedExports> {
  const printed = await report.printed();
  const document = readDocx(await report.download('DOCX'));
  const workbook = readXlsx(await report.download('XLSX'));
  expect(printedNumbers(printed).length).toBeGreaterThan(30);
  expectSameDocument(printed, document);
  expectSameWorkbook(printed, workbook);
  const values = sheetOf(workbook, 'Values')
    .flat()
    .flatMap((cell) => (cell.kind === 'number' ? [cell.value] : []));
  return { printed, document, workbook, values };
}

/** The workbook holds these values, to the digits on which statistics libraries agree. */
export function expectValues(
  { values }: CheckedExports,
  ...expected: readonly (readonly number[])[]
): void {
  const missing = expected
    .flat()
    .filter((one) => !values.some((value) => Math.abs(value - one) <= 1e-7 * Math.abs(one)));
  expect(missing, 'reference values that the workbook has not').toEqual([]);
}

/** A text prints these numbers one after the other; the confidence level between them is let be. */
export function expectSaid(text: string, ...sequences: readonly (readonly string[])[]): void {
  const said = numbersIn(text).filter((number) => number !== '95');
  for (const sequence of sequences) {
    expect(` ${said.join(' ')} `, text).toContain(` ${sequence.join(' ')} `);
  }
}
