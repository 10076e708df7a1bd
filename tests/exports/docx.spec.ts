import { beforeAll, describe, expect, it } from 'vitest';
import type { ComposedReport, TableElement } from '#shared/layout';
import { elementsNamed, textIn, type XmlElement } from '../builders/xml-tree';
import { exported, partText, partTree } from './file-parts';
import { sampleRequest } from './sample-request';

const REQUEST = sampleRequest();

/** Sequences of the schema. Source: ISO/IEC 29500-1, annex A (CT_PPr and its like). */
const PROPERTY_ORDERS: Readonly<Record<string, readonly string[]>> = {
  'w:pPr': words(
    'pStyle keepNext keepLines pageBreakBefore framePr widowControl numPr suppressLineNumbers pBdr',
    'shd tabs spacing ind contextualSpacing jc outlineLvl rPr sectPr',
  ),
  'w:rPr': words(
    'rStyle rFonts b bCs i iCs caps smallCaps strike dstrike color spacing w kern position sz szCs',
    'highlight u effect bdr shd fitText vertAlign rtl cs em lang',
  ),
  'w:tcPr': words('tcW gridSpan vMerge tcBorders shd noWrap tcMar textDirection tcFitText vAlign'),
  'w:sectPr': words(
    'headerReference footerReference footnotePr endnotePr type pgSz pgMar paperSrc pgBorders',
    'lnNumType pgNumType cols formProt vAlign noEndnote titlePg textDirection bidi docGrid',
  ),
};

function words(...lines: readonly string[]): readonly string[] {
  return lines.flatMap((line) => line.split(' '));
}

let file: Uint8Array;
let body: XmlElement;

beforeAll(async () => {
  file = await exported('docx', REQUEST);
  body = partTree(file, 'word/document.xml');
}, 60_000);

function tablesOf({ elements }: ComposedReport): readonly TableElement[] {
  return elements.filter((element) => element.kind === 'table');
}

function paragraphs(style: string): readonly XmlElement[] {
  return elementsNamed(body, 'w:p').filter((paragraph) => styleOf(paragraph) === style);
}

function styleOf(paragraph: XmlElement): string | undefined {
  return elementsNamed(paragraph, 'w:pStyle')[0]?.attributes['w:val'];
}

/** The text that readers show: instructions of fields are not part of it. */
function shown(element: XmlElement): string {
  return elementsNamed(element, 'w:t').map(textIn).join('');
}

describe('words', () => {
  it('have the styles that Word knows', () => {
    expect(paragraphs('Title').map(shown)).toEqual(['Wet work and hand eczema']);
    expect(paragraphs('Heading1').map(shown)).toEqual(['Results']);
    expect(paragraphs('Heading2').map(shown)).toEqual(['Hand eczema']);
    expect(paragraphs('Heading3').map(shown)).toEqual(['Points to read']);
    expect(paragraphs('BodyText').length).toBeGreaterThan(3);
  });

  it('say that this is a draft, that data are invented, and what to mind', () => {
    const lines = paragraphs('DraftNote').map(shown).join(' ');
    expect(lines).toContain('Draft, as of 3 February 2026. Study: Wet work study.');
    expect(lines).toContain('need the reading of a statistician and of a clinician');
    expect(lines).toContain('invented for demonstration');
  });

  it('tell in brackets what cannot be printed', () => {
    expect(paragraphs('Problem').map(shown)).toEqual([
      '[No analysis is chosen yet. Choose one for this block.]',
    ]);
  });

  it('keep marks and line breaks', () => {
    const [opening] = paragraphs('BodyText');
    expect(elementsNamed(opening!, 'w:br')).toHaveLength(1);
    const subscript = elementsNamed(opening!, 'w:r').find(
      (run) => elementsNamed(run, 'w:vertAlign')[0]?.attributes['w:val'] === 'subscript',
    );
    expect(shown(subscript!)).toBe('2');
  });

  it('lead to the web by a relation of their own', () => {
    const [link] = elementsNamed(body, 'w:hyperlink');
    const relations = elementsNamed(partTree(file, 'word/_rels/document.xml.rels'), 'Relationship');
    const target = relations.find(({ attributes }) => attributes.Id === link!.attributes['r:id']);
    expect(target!.attributes).toMatchObject({
      Target: 'https://example.org/data?a=1&b=2',
      TargetMode: 'External',
    });
  });

  it('number every list from 1, nested ones within', () => {
    const items = elementsNamed(body, 'w:numPr').map((item) => ({
      level: elementsNamed(item, 'w:ilvl')[0]!.attributes['w:val'],
      list: elementsNamed(item, 'w:numId')[0]!.attributes['w:val'],
    }));
    expect(items.map(({ level }) => level)).toEqual(['0', '0', '1', '1', '0', '0']);
    const [first, second, part, otherPart, third, own] = items.map(({ list }) => list);
    expect([second, third]).toEqual([first, first]);
    expect(otherPart).toBe(part);
    expect(new Set([first, part, own]).size).toBe(3);
  });
});

describe('captions', () => {
  it('count by fields that show their number already', () => {
    const captions = paragraphs('Caption').map(shown);
    const numbers = tablesOf(REQUEST.report).map(({ caption }) => caption.number);
    for (const number of numbers) {
      expect(captions.some((text) => text.startsWith(`Table\u00a0${number} `))).toBe(true);
    }
    const instructions = elementsNamed(body, 'w:instrText').map((text) => textIn(text).trim());
    expect(instructions.filter((text) => text === 'SEQ Table \\* ARABIC')).toHaveLength(4);
    expect(instructions.filter((text) => text === 'SEQ Figure \\* ARABIC')).toHaveLength(2);
  });

  it('are what cross-references point to', () => {
    const bookmarks = elementsNamed(body, 'w:bookmarkStart').map(
      (mark) => mark.attributes['w:name'],
    );
    const references = elementsNamed(body, 'w:instrText')
      .map((text) => /REF (\S+)/.exec(textIn(text))?.[1])
      .filter((name) => name !== undefined);
    expect(references).toHaveLength(2);
    expect(bookmarks).toEqual(expect.arrayContaining(references));
    expect(shown(paragraphs('BodyText')[0]!)).toContain('(Table\u00a01, Figure\u00a01)');
  });

  it('stay with their tables', () => {
    const over = paragraphs('Caption').filter((caption) => shown(caption).startsWith('Table'));
    expect(over.every((caption) => elementsNamed(caption, 'w:keepNext').length === 1)).toBe(true);
  });
});

describe('tables', () => {
  function grid(index: number): XmlElement {
    return elementsNamed(body, 'w:tbl')[index]!;
  }

  it('print what the proof prints, cell by cell', () => {
    const [first] = tablesOf(REQUEST.report);
    const texts = elementsNamed(grid(0), 'w:tr').map((row) =>
      elementsNamed(row, 'w:tc').map(shown),
    );
    const expected = [...first!.head, ...first!.rows.map(({ cells }) => cells)].map((cells) =>
      cells.map(({ runs }) => runs.map(({ text }) => text).join('')),
    );
    expect(texts).toEqual(expected);
  });

  it('repeat their heads and tear no row', () => {
    const rows = elementsNamed(grid(0), 'w:tr');
    const heads = rows.filter((row) => elementsNamed(row, 'w:tblHeader').length > 0);
    expect(heads).toHaveLength(tablesOf(REQUEST.report)[0]!.head.length);
    expect(rows.every((row) => elementsNamed(row, 'w:cantSplit').length === 1)).toBe(true);
  });

  it('have three rules and no upright ones', () => {
    const rows = elementsNamed(grid(0), 'w:tr');
    const edges = (row: XmlElement, edge: string) =>
      elementsNamed(row, 'w:tcBorders').flatMap((borders) => elementsNamed(borders, edge)).length;
    const ruled = rows.map((row) => [edges(row, 'w:top') > 0, edges(row, 'w:bottom') > 0]);
    expect(ruled[0]).toEqual([true, true]);
    expect(ruled.at(-1)).toEqual([false, true]);
    expect(ruled.slice(1, -1).flat()).not.toContain(true);
    expect(edges(grid(0), 'w:left') + edges(grid(0), 'w:right')).toBe(0);
  });

  it('have fixed widths that fit the text', () => {
    for (const table of elementsNamed(body, 'w:tbl').slice(0, 3)) {
      const layout = elementsNamed(table, 'w:tblLayout')[0]!.attributes['w:type'];
      const widths = elementsNamed(table, 'w:gridCol').map((column) =>
        Number(column.attributes['w:w']),
      );
      expect(layout).toBe('fixed');
      expect(widths.reduce((total, width) => total + width, 0)).toBeLessThanOrEqual(9072);
    }
  });

  it('turn the page where they are wide, and split where no page is wide enough', () => {
    const sections = elementsNamed(body, 'w:pgSz').map((size) => size.attributes['w:orient']);
    expect(sections).toEqual(['portrait', 'landscape', 'portrait']);
    expect(paragraphs('Caption').map(shown)).toContain('Table\u00a04, continued');
    const [wide] = tablesOf(REQUEST.report).slice(-1);
    const panels = elementsNamed(body, 'w:tbl').slice(3);
    const cells = panels.flatMap((panel) =>
      elementsNamed(panel, 'w:tr').flatMap((row) => elementsNamed(row, 'w:tc').map(shown)),
    );
    for (const { cells: printed } of wide!.rows) {
      for (const { runs } of printed) {
        expect(cells).toContain(runs.map(({ text }) => text).join(''));
      }
    }
  });
});

describe('figures', () => {
  it('are vectors with a raster behind them, and say what they show', () => {
    const figure = REQUEST.report.elements.find((element) => element.kind === 'figure')!;
    const [about] = elementsNamed(body, 'wp:docPr');
    expect(about!.attributes).toMatchObject({ name: 'Figure 1', descr: figure.altText });
    const relations = partText(file, 'word/_rels/document.xml.rels');
    expect(relations).toContain('media/image1.svg');
    expect(relations).toContain('media/image1.png');
    const svg = partText(file, 'word/media/image1.svg');
    expect(svg).not.toContain('<text');
    expect(svg).toContain('<path');
  });
});

describe('the document', () => {
  it('tells its title, language and the moment of the last change', () => {
    const properties = partText(file, 'docProps/core.xml');
    expect(properties).toContain('<dc:title>Wet work and hand eczema</dc:title>');
    expect(properties).toContain('<dc:language>en-GB</dc:language>');
    expect(properties.match(/2026-02-03T23:30:00Z/g)).toHaveLength(2);
    expect(partText(file, 'word/styles.xml')).toContain('<w:lang w:val="en-GB"');
  });

  it('numbers its pages and lines as the house style says', () => {
    expect(partText(file, 'word/footer1.xml')).toContain('PAGE');
    expect(elementsNamed(body, 'w:lnNumType')[0]!.attributes).toMatchObject({ 'w:countBy': '1' });
  });

  it('keeps properties in the order that the standard asks for', () => {
    const parts = ['word/document.xml', 'word/styles.xml', 'word/header1.xml', 'word/footer1.xml'];
    for (const tree of parts.map((path) => partTree(file, path))) {
      for (const [name, order] of Object.entries(PROPERTY_ORDERS)) {
        for (const element of elementsNamed(tree, name)) {
          const children = element.children.map((child) => (child as XmlElement).name.slice(2));
          const sorted = children.toSorted(
            (one, other) => order.indexOf(one) - order.indexOf(other),
          );
          expect(order).toEqual(expect.arrayContaining(children));
          expect(children).toEqual(sorted);
        }
      }
    }
  });

  it('leaves captions, notes and pictures out of the numbering of lines', () => {
    const styles = elementsNamed(partTree(file, 'word/styles.xml'), 'w:style');
    const unnumbered = styles
      .filter((style) => elementsNamed(style, 'w:suppressLineNumbers').length > 0)
      .map(({ attributes }) => attributes['w:styleId']);
    expect(unnumbered.toSorted()).toEqual(['Caption', 'DraftNote', 'Figure', 'TableNote']);
  });

  it('has no part that is not well-formed', () => {
    for (const path of [
      'word/styles.xml',
      'word/numbering.xml',
      'word/settings.xml',
      'docProps/core.xml',
    ]) {
      expect(() => partTree(file, path)).not.toThrow();
    }
  });
});
