import { describe, expect, it } from 'vitest';
import { elementsNamed, textIn } from '../builders/xml-tree';
import { exported, partText, partTree } from './file-parts';
import { laidRequest } from './laid-report';

const RTL = 'מטבח וגינה';
const LONG = 'seventeen-hours-of-'.repeat(40);

/** What was typed, and what a file shows for it. */
const LABELS: readonly (readonly [name: string, typed: string, shown: string])[] = [
  ['a formula', '=1+1', '=1+1'],
  ['a command', '@SUM(A1)', '@SUM(A1)'],
  ['a plus', '+cmd|calc', '+cmd|calc'],
  ['a minus', '-2+3', '-2+3'],
  ['a tab before a formula', '\t=1+1', ' =1+1'],
  ['a line end before a formula', '\r=1+1', '\n=1+1'],
  ['markup', '<b>&"\'</b>', '<b>&"\'</b>'],
  ['an entity', '&lt;w:p/&gt;', '&lt;w:p/&gt;'],
  ['the end of a CDATA section', ']]><x/>', ']]><x/>'],
  ['a field', '{ INCLUDETEXT "c:\\\\x" }', '{ INCLUDETEXT "c:\\\\x" }'],
  ['a code of a workbook', '_x0041_', '_x0041_'],
  ['control characters', 'a\u0000b\u0007c\u001bd\u0085e', 'abcde'],
  ['half a pair', 'a\ud83db', 'a\ufffdb'],
  ['turned text', 'a\u202eb', 'ab'],
  ['right to left', RTL, RTL],
  ['emoji', 'hand 👩‍🍳 soap', 'hand 👩‍🍳 soap'],
  ['a very long label', LONG, LONG],
];

function request(typed: string) {
  return laidRequest({ title: typed, words: typed, level: typed, category: typed });
}

describe('in a document', () => {
  it.each(LABELS)(
    'stays text: %s',
    async (_name, typed, shown) => {
      const file = await exported('docx', request(typed));
      const body = partTree(file, 'word/document.xml');
      const heading = elementsNamed(body, 'w:p').find((paragraph) =>
        elementsNamed(paragraph, 'w:pStyle').some(
          ({ attributes }) => attributes['w:val'] === 'Heading1',
        ),
      )!;
      const lines = elementsNamed(heading, 'w:t').map(textIn);
      expect(lines.join('\n')).toBe(shown);
      expect(elementsNamed(body, 'w:instrText').map((text) => textIn(text).trim())).toEqual([
        'REF _Ref100000001 \\h \\* MERGEFORMAT',
        'SEQ Table \\* ARABIC',
        'SEQ Figure \\* ARABIC',
      ]);
      expect(elementsNamed(body, 'wp:docPr')[0]!.attributes.descr).toBe(shown.replace('\n', ' '));
      const title = elementsNamed(partTree(file, 'docProps/core.xml'), 'dc:title').map(textIn);
      expect(title).toEqual([shown.replace('\n', ' ')]);
      expect(() => partTree(file, 'word/media/image1.svg')).not.toThrow();
    },
    60_000,
  );

  it('a link to a script is no link', async () => {
    const file = await exported('docx', laidRequest());
    expect(partText(file, 'word/_rels/document.xml.rels')).not.toContain('javascript');
    expect(elementsNamed(partTree(file, 'word/document.xml'), 'w:hyperlink')).toHaveLength(1);
  }, 60_000);

  it('text that the fonts of figures lack stays text in the vector', async () => {
    const file = await exported('docx', request(RTL));
    expect(partText(file, 'word/media/image1.svg')).toContain(RTL);
  }, 60_000);
});

describe('in a workbook', () => {
  it.each(LABELS)(
    'stays text: %s',
    async (_name, typed, shown) => {
      const file = await exported('xlsx', request(typed));
      const sheet = partTree(file, 'xl/worksheets/sheet1.xml');
      expect(elementsNamed(sheet, 'f')).toHaveLength(0);
      const strings = elementsNamed(partTree(file, 'xl/sharedStrings.xml'), 'si').map((item) =>
        elementsNamed(item, 't')
          .map(textIn)
          .join('')
          .replace(/_x005F_/g, '_'),
      );
      expect(strings).toContain(shown);
      expect(elementsNamed(partTree(file, 'xl/workbook.xml'), 'sheet')[0]!.attributes.name).toBe(
        'Table 1',
      );
    },
    60_000,
  );

  it.each(LABELS.slice(0, 6))(
    'is marked as text for who edits it: %s',
    async (_name, typed, shown) => {
      const file = await exported('xlsx', request(typed));
      const strings = elementsNamed(partTree(file, 'xl/sharedStrings.xml'), 'si').map(textIn);
      const cell = elementsNamed(partTree(file, 'xl/worksheets/sheet1.xml'), 'c').find(
        (one) => one.attributes.t === 's' && strings[Number(textIn(one))] === shown,
      )!;
      const formats = elementsNamed(
        elementsNamed(partTree(file, 'xl/styles.xml'), 'cellXfs')[0]!,
        'xf',
      );
      expect(formats[Number(cell.attributes.s)]!.attributes.quotePrefix).toBe('1');
    },
    60_000,
  );
});
