import { csvText } from './csv';

const HEADER = ['clinic', 'letter', 'attended', 'invited'];

/** Invented counts of a trial of reminder letters, by clinic: attended and invited. */
const ROWS = [
  ['Quayside', 'usual invitation', 131, 248],
  ['Quayside', 'reminder letter', 158, 251],
  ['Millbrook', 'usual invitation', 96, 205],
  ['Millbrook', 'reminder letter', 117, 203],
  ['Upper Town', 'usual invitation', 174, 312],
  ['Upper Town', 'reminder letter', 203, 309],
  ['Fernhill', 'usual invitation', 58, 140],
  ['Fernhill', 'reminder letter', 69, 143],
] as const;

/** The reminder trial, aggregated with events and totals. All invented. */
export function reminderLetterFiles(): Readonly<Record<string, string>> {
  return { 'reminder-letters-by-clinic.csv': csvText(HEADER, ROWS) };
}
