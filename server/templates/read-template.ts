import { readFileSync } from 'node:fs';
import type { Issue, Result } from '#shared/core';

/**
 * Reads a JSON template with its parser. A template that is missing or broken stops the start:
 * throws with the file's name and what is wrong with it.
 */
export function readTemplate<Value>(
  path: string,
  parse: (json: unknown) => Result<Value, Issue>,
): Value {
  const parsed = parse(parseJson(path));
  if (parsed.ok) return parsed.value;
  const message = parsed.issue.facts?.message;
  throw new Error(`${path} cannot be used: ${String(message ?? parsed.issue.code)}`);
}

function parseJson(path: string): unknown {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch (problem) {
    const reason = problem instanceof Error ? problem.message : 'unreadable';
    throw new Error(`${path} cannot be read: ${reason}`, { cause: problem });
  }
}
