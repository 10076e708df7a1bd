import { failure, success, type Issue, type Result } from '#shared/core';
import { NO_BREAK_SPACE } from '#shared/format';
import { EFFECT_MEASURE_IDS } from '#shared/effects/measure-ids';
import { STUDY_DESIGNS } from '#shared/effects/study-design';
import { PATTERN_SLOTS, type Phrasebook } from './phrasebook';

/** Why a phrasebook cannot be used; facts: place (of the entry), message (one plain sentence). */
export type PhrasebookIssue = Issue<'phrasebookInvalid'>;

/**
 * Reads a phrasebook from parsed JSON.
 *
 * Every pattern of PATTERN_SLOTS must be there, may name its own slots only, and each of them once
 * at least; "~" is a space that does not break. Gives the first entry that is missing or wrong.
 */
export function parsePhrasebook(json: unknown): Result<Phrasebook, PhrasebookIssue> {
  if (!isRecord(json)) {
    return invalid('phrasebook', 'The phrasebook must be an object.');
  }
  const issue =
    issueOfVersion(json) ??
    issueOfTerms(json.terms) ??
    issueOfPatterns(json.patterns) ??
    issueOfWords(json.abbreviations, 'abbreviations');
  return issue ? failure(issue) : success(withNoBreakSpaces(json) as Phrasebook);
}

type Json = Readonly<Record<string, unknown>>;

function isRecord(value: unknown): value is Json {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function issueOf(place: string, message: string): PhrasebookIssue {
  return { code: 'phrasebookInvalid', facts: { place, message } };
}

function invalid(place: string, message: string): Result<never, PhrasebookIssue> {
  return failure(issueOf(place, message));
}

function issueOfVersion(json: Json): PhrasebookIssue | null {
  if (json.schemaVersion !== 1) {
    return issueOf('schemaVersion', 'This program reads phrasebooks of schema version 1 only.');
  }
  return typeof json.language === 'string' && json.language !== ''
    ? null
    : issueOf('language', 'The phrasebook must name its language, as in "en".');
}

function issueOfTerms(terms: unknown): PhrasebookIssue | null {
  const paths = STUDY_DESIGNS.flatMap((design) =>
    TERM_PATHS.map((path) => ['terms', design, ...path]),
  );
  const missing = paths.find((path) => !isWords(at({ terms }, path)));
  if (missing) {
    const place = missing.join('.');
    return issueOf(place, `The phrasebook has no words at ${place}.`);
  }
  const without = STUDY_DESIGNS.flatMap((design) =>
    ['harmful', 'beneficial'].map((desirability) => ['terms', design, desirability, 'occurrence']),
  ).find((path) => !String(at({ terms }, path)).includes('{outcome}'));
  return without
    ? issueOf(without.join('.'), `${without.join('.')} must name the slot {outcome}.`)
    : null;
}

const TERM_PATHS: readonly (readonly string[])[] = [
  ...['harmful', 'beneficial'].flatMap((desirability) =>
    ['noun', 'head', 'occurrence'].map((term) => [desirability, term]),
  ),
  ...EFFECT_MEASURE_IDS.flatMap((measure) =>
    ['name', 'short', 'head'].map((term) => ['measures', measure, term]),
  ),
];

function at(json: Json, path: readonly string[]): unknown {
  return path.reduce<unknown>((value, key) => (isRecord(value) ? value[key] : undefined), json);
}

function isWords(value: unknown): value is string {
  return typeof value === 'string' && value.trim() !== '';
}

function issueOfPatterns(patterns: unknown): PhrasebookIssue | null {
  if (!isRecord(patterns)) {
    return issueOf('patterns', 'The phrasebook has no patterns.');
  }
  const unknown = Object.keys(patterns).find((key) => !Object.hasOwn(PATTERN_SLOTS, key));
  if (unknown !== undefined) {
    return issueOf(`patterns.${unknown}`, `There is no pattern called "${unknown}".`);
  }
  for (const [key, slots] of Object.entries(PATTERN_SLOTS)) {
    const issue = issueOfPattern(key, patterns[key], slots);
    if (issue) {
      return issue;
    }
  }
  return null;
}

function issueOfPattern(
  key: string,
  pattern: unknown,
  slots: readonly string[],
): PhrasebookIssue | null {
  const place = `patterns.${key}`;
  if (typeof pattern !== 'string') {
    return issueOf(place, `The pattern "${key}" is missing.`);
  }
  const named = [...pattern.matchAll(/\{(\w+)\}/g)].map(([, slot]) => slot ?? '');
  const unknown = named.find((slot) => !slots.includes(slot));
  if (unknown !== undefined) {
    return issueOf(place, `The pattern "${key}" has no slot called {${unknown}}.`);
  }
  const unused = slots.find((slot) => !named.includes(slot));
  return unused === undefined
    ? null
    : issueOf(place, `The pattern "${key}" must name the slot {${unused}}.`);
}

function issueOfWords(words: unknown, place: string): PhrasebookIssue | null {
  if (!isRecord(words)) {
    return issueOf(place, `The phrasebook has no ${place}.`);
  }
  const empty = Object.keys(words).find((key) => !isWords(words[key]));
  return empty === undefined
    ? null
    : issueOf(`${place}.${empty}`, `"${empty}" under ${place} has no words.`);
}

function withNoBreakSpaces(value: unknown): unknown {
  if (typeof value === 'string') {
    return value.replaceAll('~', NO_BREAK_SPACE);
  }
  return isRecord(value)
    ? Object.fromEntries(Object.entries(value).map(([key, part]) => [key, withNoBreakSpaces(part)]))
    : value;
}
