import { csvText } from './csv';

const HEADER = ['age_band', 'evening_screen_hours', 'cases', 'controls'];

/** Invented counts of a case-control study: people needing new spectacles, and controls. */
const ROWS = [
  ['18-29', 'under 1 h', 14, 48],
  ['18-29', '1 to <2 h', 22, 57],
  ['18-29', '2 to <4 h', 41, 66],
  ['18-29', '4 h or more', 33, 39],
  ['30-44', 'under 1 h', 21, 61],
  ['30-44', '1 to <2 h', 34, 72],
  ['30-44', '2 to <4 h', 49, 70],
  ['30-44', '4 h or more', 36, 37],
  ['45-59', 'under 1 h', 38, 74],
  ['45-59', '1 to <2 h', 44, 69],
  ['45-59', '2 to <4 h', 47, 58],
  ['45-59', '4 h or more', 31, 29],
] as const;

/** The case-control study, aggregated with cases and controls. All invented. */
export function screenUseFiles(): Readonly<Record<string, string>> {
  return { 'evening-screen-use.csv': csvText(HEADER, ROWS) };
}
