import type { Run } from '#shared/layout';
import { documentToRuns } from './text-runs';
import type { BoundValueFormat, TextDocument } from './text-document';

/**
 * The plain text of a document in one line; atoms read as `valueText` says, by default as a mark
 * in brackets.
 */
export function documentToText(
  document: TextDocument,
  valueText: (addressKey: string, format: BoundValueFormat) => string = () => '[value]',
): string {
  const runs = documentToRuns(document, {
    blockId: '',
    valueOf: (key, format) => ({
      state: 'missing',
      parts: [{ text: valueText(key, format), addresses: [] }],
    }),
  });
  return runs.map(runText).join('');
}

/** Whether a document has no text and no atoms. */
export function isEmptyDocument(document: TextDocument): boolean {
  return documentToText(document).trim() === '';
}

function runText(run: Run): string {
  return run.reference === undefined ? run.text : '[reference]';
}
