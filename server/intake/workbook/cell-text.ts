import type { SheetNotes } from './sheet-notes';
import { dayText } from './number-formats';
import { plainText } from './text-gatherer';
import type { OpenedWorkbook } from './workbook-parts';

/** A cell as it stands in the sheet. */
export interface RawCell {
  readonly reference: string;
  readonly type: string;
  readonly style: number;
  hasFormula: boolean;
  value: string;
}

/**
 * What a cell says, as text or as the bytes of a shared text: numbers in their shortest form with
 * a decimal point, dates by ISO 8601, truth values as TRUE and FALSE, errors by their name.
 *
 * Formulas are never computed; their stored result counts. `inline` is the text written within
 * the cell itself. Source: ISO/IEC 29500-1, 18.18.11 (cell types).
 */
export function cellText(
  cell: RawCell,
  inline: string,
  workbook: OpenedWorkbook,
  notes: SheetNotes,
): Uint8Array | string {
  if (cell.hasFormula && cell.value === '' && cell.type !== 'str') notes.formulaWithoutValue();
  switch (cell.type) {
    case 's':
      return workbook.sharedTexts.at(cell.value === '' ? -1 : Number(cell.value));
    case 'inlineStr':
      return inline;
    case 'str':
      return plainText(cell.value);
    case 'b':
      return truthText(cell.value);
    case 'e':
      notes.errorCell(cell.reference, cell.value);
      return cell.value;
    case 'd':
      return cell.value.replace(/T00:00:00(?:\.0+)?Z?$/, '').replace(/(\.\d+)?Z$/, '');
    default:
      return numberText(cell, workbook);
  }
}

function truthText(value: string): string {
  if (value === '') return '';
  return value === '1' || value === 'true' ? 'TRUE' : 'FALSE';
}

function numberText({ value, style }: RawCell, { styles, calendar }: OpenedWorkbook): string {
  const number = Number(value);
  if (value.trim() === '' || !Number.isFinite(number)) return value.trim();
  const meaning = styles[style] ?? 'number';
  const day = meaning === 'number' ? null : dayText(number, meaning, calendar);
  return day ?? String(number);
}
