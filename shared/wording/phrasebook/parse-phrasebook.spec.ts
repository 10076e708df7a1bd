import { describe, expect, it } from 'vitest';
import english from '../../../templates/phrasebooks/en.json';
import { parsePhrasebook } from './parse-phrasebook';
import { PATTERN_SLOTS } from './phrasebook';

function messageOf(change: (book: Record<string, Record<string, unknown>>) => void): unknown {
  const book = structuredClone(english) as unknown as Record<string, Record<string, unknown>>;
  change(book);
  const parsed = parsePhrasebook(book);
  return parsed.ok ? 'accepted' : parsed.issue.facts?.message;
}

describe('the English phrasebook', () => {
  it('is read, with no-break spaces in place of tildes', () => {
    const parsed = parsePhrasebook(english);
    expect(parsed.ok && parsed.value.patterns['size.percentagePoints']).toBe(
      '{size}\u00a0percentage points',
    );
  });

  it('has every pattern and no other', () => {
    expect(Object.keys(english.patterns).toSorted()).toEqual(Object.keys(PATTERN_SLOTS).toSorted());
  });
});

describe('a phrasebook that cannot be used', () => {
  it.each([
    [
      'a pattern is missing',
      (book: Record<string, Record<string, unknown>>) => {
        delete book.patterns!['absolute.clear'];
      },
      'The pattern "absolute.clear" is missing.',
    ],
    [
      'a pattern names a slot that it does not have',
      (book: Record<string, Record<string, unknown>>) => {
        book.patterns!['within.default'] = 'in {level} of {column} at {time}';
      },
      'The pattern "within.default" has no slot called {time}.',
    ],
    [
      'a pattern leaves a slot out',
      (book: Record<string, Record<string, unknown>>) => {
        book.patterns!['within.default'] = 'in {level}';
      },
      'The pattern "within.default" must name the slot {column}.',
    ],
    [
      'a pattern is unknown',
      (book: Record<string, Record<string, unknown>>) => {
        book.patterns!['absolute.cleer'] = 'x';
      },
      'There is no pattern called "absolute.cleer".',
    ],
    [
      'a design has no nouns',
      (book: Record<string, Record<string, unknown>>) => {
        delete book.terms!.trial;
      },
      'The phrasebook has no words at terms.trial.harmful.noun.',
    ],
    [
      'an occurrence does not name the outcome',
      (book: Record<string, Record<string, unknown>>) => {
        (book.terms!.cohort as Record<string, Record<string, string>>).harmful!.occurrence = 'risk';
      },
      'terms.cohort.harmful.occurrence must name the slot {outcome}.',
    ],
    [
      'an abbreviation has no words',
      (book: Record<string, Record<string, unknown>>) => {
        book.abbreviations!.CI = '';
      },
      '"CI" under abbreviations has no words.',
    ],
  ])('%s', (_name, change, message) => {
    expect(messageOf(change)).toBe(message);
  });

  it.each([[null], ['text'], [[]]])('is no %j', (json) => {
    expect(parsePhrasebook(json)).toMatchObject({ ok: false });
  });
});
