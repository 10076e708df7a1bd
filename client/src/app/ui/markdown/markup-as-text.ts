import type { MarkedExtension } from 'marked';

const ESCAPES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
};

/** Shows HTML within Markdown as the characters that were typed, instead of obeying it. */
export const markupAsText: MarkedExtension = {
  renderer: {
    html: ({ text }) => text.replace(/[&<>"]/g, (character) => ESCAPES[character] ?? character),
  },
};
