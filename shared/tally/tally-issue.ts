import type { Issue } from '#shared/core';

/**
 * Why records can't be counted as asked. `facts` name the column, the level or the value; rows are
 * counted from 1, without the header.
 */
export type TallyIssue = Issue<
  | 'unknownColumn'
  | 'columnTwice'
  | 'columnNotInData'
  | 'columnIsNoFactor'
  | 'unknownLevel'
  | 'countNotUsable'
  | 'eventsExceedTotal'
  | 'countsTooLarge'
  | 'tooManyCells'
>;

/** Says in plain words why records can't be counted as asked. */
export function tallyIssueMessage({ code, facts = {} }: TallyIssue): string {
  return MESSAGES[code](facts);
}

type Facts = NonNullable<TallyIssue['facts']>;

const MESSAGES: Readonly<Record<TallyIssue['code'], (facts: Facts) => string>> = {
  unknownColumn: ({ column }) => `The code book has no column "${said(column)}".`,
  columnTwice: ({ column }) => `"${said(column)}" was chosen twice. Choose different columns.`,
  columnNotInData: ({ column }) => `These data have no column "${said(column)}".`,
  columnIsNoFactor: ({ column }) =>
    `"${said(column)}" has no levels to count by. Make it a category, or band its numbers.`,
  unknownLevel: ({ column, level }) =>
    `"${said(column)}" has no level "${said(level)}" any more. Choose another one.`,
  countNotUsable: ({ column, value, row }) =>
    said(value).trim() === ''
      ? `Row ${said(row)} of the count column "${said(column)}" is blank, ` +
        'and every row has to have a count.'
      : `Row ${said(row)} of the count column "${said(column)}" holds "${said(value)}", ` +
        'which is not a whole number of 0 or more.',
  eventsExceedTotal: ({ row, events, total }) =>
    `Row ${said(row)} has more events (${said(events)}) than people in total (${said(total)}).`,
  countsTooLarge: () => 'The counts add up to more than 2^53, which can no longer be exact.',
  tooManyCells: () => 'These columns make too many combinations of levels. Choose fewer columns.',
};

function said(fact: string | number | readonly string[] | undefined): string {
  return typeof fact === 'object' ? fact.join(', ') : String(fact ?? '');
}
