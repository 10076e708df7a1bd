import { Slice } from 'prosemirror-model';
import { Plugin } from 'prosemirror-state';
import type { EditorView } from 'prosemirror-view';
import { markdownToDocument } from '#shared/report/text/markdown';
import { nodeOfDocument } from '#shared/report/text/parse-text-document';
import type { TextShape } from './text-shape';

/** Reads pasted plain text as Markdown. Formatted text is left to the editor's own reading. */
export function markdownPaste(shape: TextShape): Plugin {
  return new Plugin({
    props: {
      handlePaste: (view, event) => {
        const text = event.clipboardData?.getData('text/plain') ?? '';
        const html = event.clipboardData?.getData('text/html') ?? '';
        if (text.trim() === '' || isFormatted(html)) return false;
        paste(view, shape === 'one' ? text.replace(/\s+/gu, ' ') : text);
        return true;
      },
    },
  });
}

/** HTML that only colours text, as code editors give it, says less than its Markdown. */
export function isFormatted(html: string): boolean {
  return (
    /<(?:ul|ol|strong|b|em|i|a|h[1-6]|sup|sub|p)[\s>]/iu.test(html) ||
    html.includes('data-pm-slice')
  );
}

function paste(view: EditorView, markdown: string): void {
  const { content } = nodeOfDocument(markdownToDocument(markdown));
  const slice = Slice.maxOpen(content);
  view.dispatch(view.state.tr.replaceSelection(slice).scrollIntoView());
}
