import type { User } from '../../models/user/user-store';

const FEWEST_DIFFERENT_CHARACTERS = 5;
const GUESSED_FIRST: readonly string[] = [
  'password',
  'passwort',
  'qwertyuiop',
  'letmein',
  'welcome',
  'changeme',
  'iloveyou',
  'administrator',
  'evenhand',
];

/**
 * Why a password of sufficient length would still be guessed first, in words for its field; null
 * for a good one.
 *
 * Source: NIST SP 800-63B, 3.1.1.2 (common, repetitive, sequential and context-specific values).
 */
export function passwordWeakness(
  password: string,
  person: Pick<User, 'name' | 'email'>,
): string | null {
  const lowered = password.toLowerCase();
  if (new Set(lowered).size < FEWEST_DIFFERENT_CHARACTERS || isSequence(lowered)) {
    return 'This repeats or counts the same few characters. Use several words instead.';
  }
  if (leaves(lowered, GUESSED_FIRST) < 6) {
    return 'This is among the passwords that are guessed first. Use several words instead.';
  }
  const own = [...person.name.split(/\s+/), person.email, ...person.email.split(/[@.]/)];
  if (leaves(lowered, own) < 6) {
    return 'This is made of your name or address. Use several other words instead.';
  }
  return null;
}

/** How many letters and digits stay when the words are taken out; all when none is in it. */
function leaves(password: string, words: readonly string[]): number {
  const longestFirst = words.map((word) => word.toLowerCase()).filter((word) => word.length > 2);
  longestFirst.sort((one, other) => other.length - one.length);
  const left = longestFirst.reduce((rest, word) => rest.replaceAll(word, ''), password);
  return left === password ? password.length : left.replace(/[^\p{L}\p{N}]/gu, '').length;
}

/** Whether every character but the first few follows the one before it, up or down. */
function isSequence(password: string): boolean {
  const codes = Array.from(password, (character) => character.codePointAt(0) ?? 0);
  const steps = codes.slice(1).map((code, index) => code - (codes[index] ?? 0));
  return steps.filter((step) => Math.abs(step) === 1).length >= steps.length - 1;
}
