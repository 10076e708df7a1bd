import type { Node } from 'prosemirror-model';
import { Plugin } from 'prosemirror-state';
import { Decoration, DecorationSet } from 'prosemirror-view';
import { splitNumerals } from '#shared/report/text/numerals';

/** Marks digits that were typed, as the proof does: they have no source. */
export function typedNumerals(): Plugin<DecorationSet> {
  return new Plugin<DecorationSet>({
    state: {
      init: (_config, state) => marksIn(state.doc),
      apply: (transaction, marks) => (transaction.docChanged ? marksIn(transaction.doc) : marks),
    },
    props: {
      decorations(state) {
        return this.getState(state);
      },
    },
  });
}

function marksIn(document: Node): DecorationSet {
  const marks: Decoration[] = [];
  document.descendants((node, position) => {
    let start = position;
    for (const part of splitNumerals(node.text ?? '')) {
      const end = start + part.text.length;
      if (part.numeral) marks.push(Decoration.inline(start, end, { class: 'typed' }));
      start = end;
    }
  });
  return DecorationSet.create(document, marks);
}
