import { COMMON_WORDS } from './ordered-words';

const LONGEST_LABEL = 200;

/** A column's name as a label for tables: "wet_work" becomes "Wet work". */
export function labelOfName(name: string): string {
  const words = name
    .replace(/\s*\([^()]*\)\s*$/, '')
    .replace(/([a-z])([A-Z])/g, (_, end: string, start: string) => `${end} ${start.toLowerCase()}`)
    .replace(/[_\s]+/g, ' ')
    .trim();
  const shown = words === '' ? name.trim() || 'Column' : words;
  return (shown.charAt(0).toUpperCase() + shown.slice(1)).slice(0, LONGEST_LABEL);
}

/** The unit that a name gives in brackets, as in "Age (years)"; null without. */
export function unitOfName(name: string): string | null {
  const unit = /\(([^()]{1,60})\)\s*$/.exec(name)?.[1]?.trim();
  return unit === undefined || unit === '' ? null : unit;
}

/** A label as it stands inside a sentence: small first letter, unless it is an abbreviation. */
export function sentenceLabelOfName(label: string): string {
  return /^[A-Z][a-z]/.test(label) ? label.charAt(0).toLowerCase() + label.slice(1) : label;
}

/** A code of the file as a label for tables. */
export function labelOfCode(code: string): string {
  const shown = code.trim().replace(/\s+/g, ' ');
  return shown === '' ? 'Blank' : shown.slice(0, LONGEST_LABEL);
}

/** A level's label inside a sentence; only words that are surely no names are written small. */
export function sentenceLabelOfLevel(label: string): string {
  const small = label.toLowerCase();
  return COMMON_WORDS.includes(small) ? small : label;
}
