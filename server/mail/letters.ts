import { readFileSync } from 'node:fs';
import { join } from 'node:path';

/** Every letter, with the facts that its template may name. */
const LETTERS = {
  'password-reset': ['name', 'link'],
  invitation: ['name', 'inviter', 'link', 'address', 'email'],
  'study-invitation': ['name', 'inviter', 'study', 'link', 'address', 'email'],
  'password-changed': ['name', 'address'],
} as const;

/** Which letter. */
export type LetterName = keyof typeof LETTERS;

/** What a letter is filled with. */
export type LetterFacts<Name extends LetterName> = Readonly<
  Record<(typeof LETTERS)[Name][number], string>
>;

/** A letter ready to send. */
export interface Letter {
  readonly subject: string;
  readonly text: string;
}

/** Writes letters from the templates. */
export type WriteLetter = <Name extends LetterName>(name: Name, facts: LetterFacts<Name>) => Letter;

/**
 * Reads `mail/<letter>.txt` of the templates: a line `Subject: …`, an empty line, the text.
 *
 * Throws with the file's name when a template is missing, malformed, or names an unknown fact.
 */
export function readLetters(templatesDirectory: string): WriteLetter {
  const templates = new Map<LetterName, Letter>();
  for (const name of Object.keys(LETTERS) as LetterName[]) {
    templates.set(name, readTemplate(join(templatesDirectory, 'mail', `${name}.txt`), name));
  }
  return (name, facts) => {
    const template = templates.get(name);
    if (template === undefined) throw new Error(`There is no letter "${name}".`);
    return { subject: template.subject, text: fill(template.text, facts) };
  };
}

function readTemplate(path: string, name: LetterName): Letter {
  const parts = /^Subject: (.+)\r?\n\r?\n([^]+)$/.exec(readFileSync(path, 'utf8'));
  if (parts === null) throw new Error(`${path} must begin with "Subject: …" and an empty line.`);
  const [, subject = '', text = ''] = parts;
  refuseUnknownFacts(path, `${subject} ${text}`, LETTERS[name]);
  return { subject, text };
}

function refuseUnknownFacts(path: string, text: string, known: readonly string[]): void {
  const named = [...text.matchAll(/\{(\w+)\}/g)].map(([, fact = '']) => fact);
  const unknown = named.filter((fact) => !known.includes(fact));
  if (unknown.length === 0) return;
  throw new Error(`${path} names {${unknown.join('}, {')}}; known are {${known.join('}, {')}}.`);
}

/** Facts are data: a line break in a name can't add lines to a letter. */
function fill(text: string, facts: Readonly<Record<string, string>>): string {
  return text.replace(/\{(\w+)\}/g, (_, fact: string) =>
    (facts[fact] ?? '').replace(/\p{Cc}+/gu, ' '),
  );
}
