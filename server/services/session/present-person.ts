import type { Person } from '#shared/api';
import type { User } from '../../models/user/user-store';

/** A person as others see them. */
export function presentPerson(user: User): Person {
  const { id, name, email, administrator } = user;
  return { id, name, email, initials: initialsOf(name), administrator };
}

/** One or two capitals: of the first and the last word of a name. */
export function initialsOf(name: string): string {
  const words = name
    .trim()
    .split(/\s+/)
    .filter((word) => word !== '');
  const chosen = words.length > 1 ? [words[0], words.at(-1)] : words;
  return chosen
    .map((word) => firstCharacter(word ?? ''))
    .join('')
    .toLocaleUpperCase('en');
}

function firstCharacter(word: string): string {
  return Array.from(word)[0] ?? '';
}
