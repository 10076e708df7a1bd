import type { EditText } from '../step';

/** A step that types text at a position of a block's document. */
export function insertText(
  blockId: string,
  baseVersion: number,
  at: number,
  text: string,
): EditText {
  return replaceText(blockId, baseVersion, { from: at, to: at }, text);
}

/** A step that replaces a range of a paragraph by text; no text deletes it. */
export function replaceText(
  blockId: string,
  baseVersion: number,
  { from, to }: { readonly from: number; readonly to: number },
  text: string,
): EditText {
  const slice = text === '' ? {} : { slice: { content: [{ type: 'text', text }] } };
  const steps = [{ stepType: 'replace', from, to, ...slice }];
  return { kind: 'editText', blockId, baseVersion, steps };
}

/** A step that sets a range in bold. */
export function embolden(
  blockId: string,
  baseVersion: number,
  { from, to }: { readonly from: number; readonly to: number },
): EditText {
  const steps = [{ stepType: 'addMark', mark: { type: 'strong' }, from, to }];
  return { kind: 'editText', blockId, baseVersion, steps };
}
