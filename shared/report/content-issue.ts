import type { Issue } from '#shared/core';

/** Why a block's content cannot be used. */
export type ContentIssueCode =
  | 'unknownBlockKind'
  | 'contentNotReadable'
  | 'textNotReadable'
  | 'textTooLong'
  | 'listTooDeep'
  | 'oneParagraphOnly';

/**
 * A refused content. `facts.field` is the path of the part that is meant, where there is one;
 * `textTooLong` carries `characters` and `most`, `listTooDeep` carries `most`.
 */
export type ContentIssue = Issue<ContentIssueCode>;
