import { describe, expect, it } from 'vitest';
import {
  documentOfNode,
  documentToElements,
  documentToRuns,
  documentToText,
  markdownToDocument,
  nodeOfDocument,
  numeralsOf,
  parseTextDocument,
  plainDocument,
} from '#shared/report/text';
import type { TextDocument } from '#shared/report/text';

const ADDRESS = 'a1/risk/l1/crude/value';

describe('parseTextDocument', () => {
  it('reads what the schema knows and drops the rest', () => {
    const value = {
      type: 'doc',
      extra: 1,
      content: [{ type: 'paragraph', content: [{ type: 'text', text: 'A', extra: true }] }],
    };
    expect(parseTextDocument(value)).toEqual({ ok: true, value: plainDocument('A') });
  });

  it('survives JSON and ProseMirror unchanged', () => {
    const document = markdownToDocument('**Bold** and *thin*\n\n1. one\n   - two\n2. three');
    const parsed = parseTextDocument(JSON.parse(JSON.stringify(document)));
    expect(parsed).toEqual({ ok: true, value: document });
    expect(documentOfNode(nodeOfDocument(document))).toEqual(document);
  });

  it.each([
    ['nothing', null],
    ['a number', 7],
    ['a text', 'doc'],
    ['an array', []],
    ['another root', { type: 'paragraph' }],
    ['no content', { type: 'doc', content: [] }],
    ['an unknown node', { type: 'doc', content: [{ type: 'image' }] }],
    ['a heading', { type: 'doc', content: [{ type: 'heading' }] }],
    ['loose text', { type: 'doc', content: [{ type: 'text', text: 'x' }] }],
    ['text that is no text', paragraphWith({ type: 'text', text: 3 })],
    ['an unknown mark', paragraphWith({ type: 'text', text: 'x', marks: [{ type: 'blink' }] })],
    ['a script link', paragraphWith(linkTo('javascript:alert(1)'))],
    ['a data link', paragraphWith(linkTo('data:text/html,x'))],
    ['a value without address', paragraphWith({ type: 'boundValue', attrs: {} })],
    [
      'a value of an unknown format',
      paragraphWith({ type: 'boundValue', attrs: { address: ADDRESS, format: 'loud' } }),
    ],
  ])('refuses %s', (_name, value) => {
    expect(parseTextDocument(value)).toEqual({ ok: false, issue: { code: 'textNotReadable' } });
  });

  it('refuses a text that is too long and says how long it may be', () => {
    const result = parseTextDocument(plainDocument('x'.repeat(200_001)));
    expect(result).toMatchObject({ ok: false, issue: { code: 'textTooLong' } });
  });

  it('refuses lists that are nested too deep, without running out of stack', () => {
    const nested = Array.from({ length: 5000 }).reduce<unknown>(
      (inner) => ({ type: 'bulletList', content: [{ type: 'listItem', content: [inner] }] }),
      { type: 'paragraph' },
    );
    const result = parseTextDocument({ type: 'doc', content: [nested] });
    expect(result).toMatchObject({ ok: false, issue: { code: 'listTooDeep', facts: { most: 6 } } });
  });

  it('takes lists of the deepest kind that Markdown gives', () => {
    const lines = [0, 1, 2, 3, 4, 5, 6, 7].map((depth) => `${'  '.repeat(depth)}- level`);
    const document = markdownToDocument(lines.join('\n'));
    expect(parseTextDocument(document)).toEqual({ ok: true, value: document });
  });
});

describe('markdownToDocument', () => {
  it('keeps raw HTML as literal text', () => {
    const document = markdownToDocument('Before <b onclick="x()">bold</b>\n\n<script>x</script>');
    expect(documentToText(document)).toBe('Before <b onclick="x()">bold</b> <script>x</script>');
  });

  it('keeps links to web and mail, and others as words', () => {
    const document = markdownToDocument('[a](https://example.org) [b](javascript:x)');
    expect(document.content[0]).toEqual({
      type: 'paragraph',
      content: [
        {
          type: 'text',
          text: 'a',
          marks: [{ type: 'link', attrs: { href: 'https://example.org' } }],
        },
        { type: 'text', text: ' ' },
        { type: 'text', text: '[b](javascript:x)' },
      ],
    });
  });

  it('loses no words of tables, code, quotes and headings', () => {
    const text = documentToText(
      markdownToDocument(
        '# Head\n\n> quote\n\n`code` &amp; &#945;\n\n| a | b |\n|---|---|\n| 1 | 2 |',
      ),
    );
    for (const word of ['Head', 'quote', 'code & α', '| 1 | 2 |']) expect(text).toContain(word);
  });

  it('gives an empty paragraph for nothing', () => {
    expect(markdownToDocument('')).toEqual(plainDocument(''));
  });
});

describe('documentToElements', () => {
  const document: TextDocument = {
    type: 'doc',
    content: [
      {
        type: 'paragraph',
        content: [
          { type: 'text', text: 'About 22% of ' },
          { type: 'boundValue', attrs: { address: ADDRESS, format: 'auto' } },
          { type: 'text', text: ' in ' },
          { type: 'crossReference', attrs: { blockId: 'b9' } },
        ],
      },
      {
        type: 'bulletList',
        content: [
          {
            type: 'listItem',
            content: [
              { type: 'paragraph', content: [{ type: 'text', text: 'A1' }] },
              {
                type: 'orderedList',
                content: [{ type: 'listItem', content: [{ type: 'paragraph' }] }],
              },
            ],
          },
        ],
      },
    ],
  };
  const context = {
    blockId: 'b1',
    valueOf: (key: string) => ({
      state: 'missing' as const,
      parts: [{ text: `[${key}]`, addresses: [] }],
    }),
  };

  it('marks typed digits, atoms and references', () => {
    const [paragraph] = documentToElements(document, context);
    expect(paragraph).toMatchObject({
      kind: 'paragraph',
      runs: [
        { text: 'About ', origin: { state: 'text' } },
        { text: '22%', origin: { state: 'typed' } },
        { text: ' of ' },
        { text: `[${ADDRESS}]`, origin: { state: 'missing', blockId: 'b1' } },
        { text: ' in ' },
        { text: '', reference: 'b9' },
      ],
    });
  });

  it('flattens lists with their depth and numbering', () => {
    const [, list] = documentToElements(document, context);
    expect(list).toMatchObject({
      kind: 'list',
      ordered: false,
      items: [
        { depth: 0, ordered: false },
        { depth: 1, ordered: true, runs: [] },
      ],
    });
  });

  it('joins everything into one line for captions', () => {
    const runs = documentToRuns(document, context);
    expect(runs.map(({ text }) => text).join('')).toBe(`About 22% of [${ADDRESS}] in  A1 `);
  });
});

describe('numeralsOf', () => {
  it.each([
    ['22% and 3.5 to −1,2', ['22%', '3.5', '−1,2']],
    ['2,542 of 12 345', ['2,542', '12', '345']],
    ['12\u202f345 people', ['12\u202f345']],
    ['A1 and B12 in 2026', ['2026']],
    ['a 2-fold rise, 3rd', ['2']],
    ['9.7–23.4', ['9.7', '23.4']],
    ['(−0.5)', ['−0.5']],
    ['no digits', []],
  ])('finds the numbers of “%s”', (text, numerals) => {
    expect(numeralsOf(text)).toEqual(numerals);
  });
});

function paragraphWith(node: unknown): unknown {
  return { type: 'doc', content: [{ type: 'paragraph', content: [node] }] };
}

function linkTo(href: string): unknown {
  return { type: 'text', text: 'x', marks: [{ type: 'link', attrs: { href } }] };
}
