import { elementsNamed, parseXml, textIn, type XmlElement } from '../../builders/xml-tree';
import { showNumber } from './number-format';
import { unzip } from './zip';

/** A cell: its words, or its number and the digits that the sheet shows for it. */
export type ReadCell =
  | { readonly kind: 'words'; readonly shown: string }
  | { readonly kind: 'number'; readonly value: number; readonly shown: string };

/** The sheets of a workbook by name; of each its rows, without cells that are empty. */
export type ReadWorkbook = ReadonlyMap<string, readonly (readonly ReadCell[])[]>;

type Tree = (path: string) => XmlElement;

/** Reads an XLSX without any code that writes one; a formula in it is an error. */
export function readXlsx(bytes: Uint8Array): ReadWorkbook {
  const files = unzip(bytes);
  const tree: Tree = (path) => {
    const part = files.get(path);
    if (part === undefined) throw new Error(`The workbook has no ${path}.`);
    return parseXml(new TextDecoder().decode(part));
  };
  const texts = elementsNamed(tree('xl/sharedStrings.xml'), 'si').map((item) =>
    elementsNamed(item, 't').map(textIn).join(''),
  );
  const formats = formatsOf(tree('xl/styles.xml'));
  const sheets = elementsNamed(tree('xl/workbook.xml'), 'sheet');
  return new Map(
    sheets.map(({ attributes }) => {
      const sheet = tree(pathOf(attributes['r:id'] ?? '', tree));
      if (elementsNamed(sheet, 'f').length > 0) throw new Error('A cell holds a formula.');
      return [attributes.name ?? '', rowsOf(sheet, texts, formats)];
    }),
  );
}

function pathOf(relation: string, tree: Tree): string {
  const relations = elementsNamed(tree('xl/_rels/workbook.xml.rels'), 'Relationship');
  const found = relations.find(({ attributes }) => attributes.Id === relation);
  return `xl/${found?.attributes.Target ?? ''}`;
}

/** The number format of every cell style, by its place. */
function formatsOf(styles: XmlElement): readonly string[] {
  const own = new Map(
    elementsNamed(styles, 'numFmt').map(({ attributes }) => [
      attributes.numFmtId ?? '',
      attributes.formatCode ?? '',
    ]),
  );
  const [cells] = elementsNamed(styles, 'cellXfs');
  return elementsNamed(cells!, 'xf').map(({ attributes }) => {
    const id = attributes.numFmtId ?? '0';
    return own.get(id) ?? BUILT_IN[id] ?? 'General';
  });
}

/** Source: ISO/IEC 29500-1, 18.8.30 (numFmt), the formats that are not written out. */
const BUILT_IN: Readonly<Record<string, string>> = {
  '0': 'General',
  '1': '0',
  '2': '0.00',
  '3': '#,##0',
  '4': '#,##0.00',
  '49': '@',
};

function rowsOf(
  sheet: XmlElement,
  texts: readonly string[],
  formats: readonly string[],
): readonly (readonly ReadCell[])[] {
  return elementsNamed(sheet, 'row').map((row) =>
    elementsNamed(row, 'c').flatMap((cell): readonly ReadCell[] => {
      const [value] = elementsNamed(cell, 'v');
      if (value === undefined) return [];
      if (cell.attributes.t === 's') {
        return [{ kind: 'words', shown: plainSpaces(texts[Number(textIn(value))] ?? '') }];
      }
      const number = Number(textIn(value));
      const format = formats[Number(cell.attributes.s ?? '0')] ?? 'General';
      return [{ kind: 'number', value: number, shown: showNumber(number, format) }];
    }),
  );
}

function plainSpaces(text: string): string {
  return text.replace(/[\s\u00a0\u2002]+/g, ' ').trim();
}
