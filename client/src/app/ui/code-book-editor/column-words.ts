import type { ColumnKind, CountLayout } from '#shared/code-book';

/** The kinds of a column in words. */
export const COLUMN_KIND_WORDS: Readonly<Record<ColumnKind, string>> = {
  category: 'Category',
  orderedCategory: 'Ordered category',
  number: 'Number',
  date: 'Date',
  personTime: 'Person-time',
  count: 'Count',
  identifier: 'Identifier',
  pairIdentifier: 'Pair identifier',
  clusterIdentifier: 'Cluster identifier',
  ignored: 'Not used',
};

/** What a kind is good for, in one sentence. */
export const COLUMN_KIND_HELP: Readonly<Record<ColumnKind, string>> = {
  category: 'Levels without an order of their own. The order here is the order in every table.',
  orderedCategory:
    'Ordered levels. The order here is the order in every table, figure and sentence.',
  number: 'Band it to compare groups or to split by it.',
  date: 'Kept with the records. No analysis uses it yet.',
  personTime: 'Time under observation. Band it to compare groups.',
  count: 'How many people a row stands for.',
  identifier: 'Tells records apart. Repeated ones bring a caution.',
  pairIdentifier: 'Tells which records belong to one pair.',
  clusterIdentifier: 'Tells which records belong to one cluster, such as a household.',
  ignored: 'Stored with the cut, and used by nothing.',
};

/** How the rows of a file count, in words. */
export const COUNT_LAYOUT_WORDS: Readonly<
  Record<CountLayout['kind'], { readonly name: string; readonly help: string }>
> = {
  records: { name: 'A record a row', help: 'Every row is one person.' },
  count: { name: 'One count column', help: 'A row says how many people are like it.' },
  eventsAndTotal: {
    name: 'Events and total',
    help: 'A row says how many had the event, and among how many.',
  },
  casesAndControls: {
    name: 'Cases and controls',
    help: 'A row says how many cases and how many controls are like it.',
  },
};

/** A code of the file as it is shown: the blank has a word. */
export function shownCode(code: string): string {
  return code.trim() === '' ? 'blank' : code;
}
