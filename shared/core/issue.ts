/**
 * An expected failure: a code that wording and HTTP map to words and statuses, with the facts that
 * the words need (a line number, a level id, a limit).
 */
export interface Issue<Code extends string = string> {
  readonly code: Code;
  readonly facts?: Readonly<Record<string, string | number | readonly string[]>>;
}
