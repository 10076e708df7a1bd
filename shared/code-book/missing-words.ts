/** Texts that usually stand for no answer, in small letters, with what they mean. */
const MISSING_WORDS: ReadonlyMap<string, string> = new Map([
  ['na', 'Not available'],
  ['n/a', 'Not available'],
  ['#n/a', 'Not available'],
  ['nan', 'Not available'],
  ['null', 'Not available'],
  ['.', 'Not available'],
  ['-', 'Not available'],
  ['--', 'Not available'],
  ['?', 'Unknown'],
  ['unknown', 'Unknown'],
  ['unk', 'Unknown'],
  ["don't know", 'Unknown'],
  ['missing', 'Missing'],
  ['not known', 'Unknown'],
  ['not recorded', 'Not recorded'],
  ['not answered', 'Not answered'],
  ['no answer', 'Not answered'],
  ['refused', 'Refused to answer'],
]);

/** The reason that a blank cell gets. */
export const BLANK_REASON = 'Blank';

/** What a code means when it looks like no answer; null for an ordinary value. */
export function missingReasonOf(code: string): string | null {
  const text = code.trim().toLowerCase();
  return text === '' ? BLANK_REASON : (MISSING_WORDS.get(text) ?? null);
}
