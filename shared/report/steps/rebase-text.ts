import { AddMarkStep, Mapping, RemoveMarkStep } from 'prosemirror-transform';
import type { Step as TextStep } from 'prosemirror-transform';
import { readTextStep } from './edit-text';
import type { EditText } from './step';

/**
 * Maps text steps over newer ones that were made against the same version; null where they touch
 * the same place (so that a person decides) or where something can't be mapped.
 */
export function rebaseText(mine: EditText, newer: readonly EditText[]): EditText | null {
  const own = readAll(mine.steps);
  const theirs = readAll(newer.flatMap((step) => step.steps));
  if (own === null || theirs === null || overlap(touched(own), touched(theirs))) return null;
  const mapped = mapOver(own, theirs);
  if (mapped === null) return null;
  return {
    ...mine,
    baseVersion: mine.baseVersion + newer.length,
    steps: mapped.map((step) => step.toJSON() as unknown),
  };
}

function readAll(steps: readonly unknown[]): readonly TextStep[] | null {
  const read = steps.map(readTextStep);
  return read.every((step) => step !== null) ? read : null;
}

interface Range {
  readonly from: number;
  readonly to: number;
}

/** The places that steps touch, in positions of the document that the first step starts from. */
function touched(steps: readonly TextStep[]): readonly Range[] {
  const back = new Mapping();
  return steps.flatMap((step) => {
    const toStart = back.invert();
    const ranges = rangesOf(step).map(({ from, to }) => ({
      from: toStart.map(from, 1),
      to: toStart.map(to, -1),
    }));
    back.appendMap(step.getMap());
    return ranges.map(({ from, to }) => ({ from: Math.min(from, to), to: Math.max(from, to) }));
  });
}

function rangesOf(step: TextStep): readonly Range[] {
  if (step instanceof AddMarkStep || step instanceof RemoveMarkStep) {
    return [{ from: step.from, to: step.to }];
  }
  const ranges: Range[] = [];
  step.getMap().forEach((from, to) => ranges.push({ from, to }));
  return ranges;
}

/** Two insertions at one place overlap too: which comes first is a person's choice. */
function overlap(mine: readonly Range[], theirs: readonly Range[]): boolean {
  return mine.some((one) =>
    theirs.some(
      (other) =>
        (one.from < other.to && other.from < one.to) ||
        (one.from === one.to && other.from === other.to && one.from === other.from),
    ),
  );
}

/** Undo mine, do theirs, do mine again: each own step is mapped through all of that. */
function mapOver(
  own: readonly TextStep[],
  theirs: readonly TextStep[],
): readonly TextStep[] | null {
  const mapped: TextStep[] = [];
  for (const [index, step] of own.entries()) {
    const next = step.map(mappingFor(own.slice(0, index), theirs, mapped));
    if (next === null) return null;
    mapped.push(next);
  }
  return mapped;
}

function mappingFor(
  before: readonly TextStep[],
  theirs: readonly TextStep[],
  mapped: readonly TextStep[],
): Mapping {
  const mapping = new Mapping();
  for (const step of before.toReversed()) mapping.appendMap(step.getMap().invert());
  for (const step of theirs) mapping.appendMap(step.getMap());
  for (const [index, step] of mapped.entries()) {
    mapping.appendMap(step.getMap(), before.length - 1 - index);
  }
  return mapping;
}
