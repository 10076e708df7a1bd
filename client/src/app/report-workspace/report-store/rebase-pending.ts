import { contentChangedBy, type EditText, rebaseStep, type Step } from '#shared/report';
import type { MadeStep } from './made-step';

/**
 * Brings the steps that wait here up to date with one that somebody else made before them.
 *
 * Only texts can be: all waiting edits of one text are mapped together, as each was made on top of
 * the one before, then taken apart again. What cannot be brought up to date stays as it is, and
 * will not apply any more.
 */
export function rebasePending(pending: readonly MadeStep[], newer: Step): readonly MadeStep[] {
  const blockId = contentChangedBy(newer);
  const texts = pending.filter(
    (made) => blockId !== null && contentChangedBy(made.step) === blockId,
  );
  const rebased = rebaseTogether(texts, newer);
  return pending.map((made) => rebased.get(made.id) ?? made);
}

function rebaseTogether(made: readonly MadeStep[], newer: Step): ReadonlyMap<string, MadeStep> {
  const texts = made.flatMap(({ step }) => (step.kind === 'editText' ? [step] : []));
  const [first] = texts;
  if (first === undefined || texts.length < made.length) return new Map();
  const together = { ...first, steps: texts.flatMap((text) => text.steps) };
  const rebased = rebaseStep(together, [newer]);
  if (!rebased.ok || rebased.value.kind !== 'editText') return new Map();
  return takenApart(made, texts, rebased.value);
}

function takenApart(
  made: readonly MadeStep[],
  texts: readonly EditText[],
  together: EditText,
): ReadonlyMap<string, MadeStep> {
  let start = 0;
  return new Map(
    made.map((each, index) => {
      const end = start + (texts[index]?.steps.length ?? 0);
      const steps = together.steps.slice(start, end);
      start = end;
      const step = { ...together, baseVersion: together.baseVersion + index, steps };
      return [each.id, { ...each, step }];
    }),
  );
}
