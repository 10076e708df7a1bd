import type { StepIssue, StepIssueCode } from './steps/step';

/** Says in plain words why a step or a content cannot be used, and what to do, as sentences. */
export function reportIssueText(issue: StepIssue): string {
  return TEXTS[issue.code](issue.facts ?? {});
}

type Facts = NonNullable<StepIssue['facts']>;

const TEXTS: Readonly<Record<StepIssueCode, (facts: Facts) => string>> = {
  unknownBlockKind: ({ kind }) => `There is no kind of block called “${String(kind)}”.`,
  contentNotReadable: ({ field }) =>
    field === undefined || field === ''
      ? 'The content of this block can’t be read.'
      : `The content of this block can’t be read: “${String(field)}” is missing or wrong.`,
  textNotReadable: () =>
    'The text can’t be read: it holds something that a report has no place for.',
  textTooLong: ({ most }) =>
    `The text is too long: a block holds ${String(most)} characters. Split it into several blocks.`,
  listTooDeep: ({ most }) => `Lists can be nested ${String(most)} deep. Take a level out.`,
  oneParagraphOnly: () => 'This takes one line of text. Put further paragraphs into a prose block.',
  unknownStep: ({ kind }) => `There is no change called “${String(kind)}”.`,
  stepNotReadable: ({ kind, field }) =>
    `The change “${String(kind)}” can’t be read: “${String(field)}” is missing or wrong.`,
  blockUnknown: () => 'This block is not in the report.',
  blockExists: () => 'A block with this id is in the report already.',
  blockRemoved: () => 'Somebody removed this block. Restore it first; your words are not lost.',
  blockNotRemoved: () => 'This block is in the report already; there is nothing to restore.',
  orderKeyNotReadable: () => 'The place of the block can’t be read.',
  textNotEditable: () => 'This block has no text of its own that can be edited in place.',
  textStepFailed: () => 'The change doesn’t fit the text as it stands now.',
  staleEdit: () =>
    'Somebody changed the same words meanwhile. Both versions are kept: choose what stands.',
  staleMove: () => 'Somebody moved this block meanwhile. Look where it stands, then move it again.',
  undoBarrier: () =>
    'Numbers moved since this change, so that it can’t be undone in one go. Change it by hand.',
};
