import { elementsNamed, parseXml, type XmlElement } from '../../builders/xml-tree';
import { unzip } from './zip';

/** A paragraph or a table of a document, as Word shows it. */
export type DocumentPart =
  | { readonly kind: 'paragraph'; readonly style: string; readonly text: string }
  | { readonly kind: 'table'; readonly rows: readonly (readonly string[])[] };

/** A picture; its vector has outlines for letters, so that its words are only in `altText`. */
export interface DocumentPicture {
  readonly altText: string;
  readonly vector: boolean;
  readonly raster: boolean;
}

/** What a reader of a DOCX sees. */
export interface ReadDocument {
  readonly parts: readonly DocumentPart[];
  readonly pictures: readonly DocumentPicture[];
  /** Everything that is written anywhere in the body. */
  readonly text: string;
}

/** Reads a DOCX without any code that writes one. */
export function readDocx(bytes: Uint8Array): ReadDocument {
  const files = unzip(bytes);
  const tree = parseXml(textOf(files, 'word/document.xml'));
  const body = elementsNamed(tree, 'w:body')[0]!;
  const parts = body.children.flatMap((child) => (typeof child === 'string' ? [] : partOf(child)));
  const pictures = elementsNamed(body, 'w:drawing').map(pictureOf);
  return { parts, pictures, text: shown(body) };
}

function pictureOf(drawing: XmlElement): DocumentPicture {
  const [properties] = elementsNamed(drawing, 'wp:docPr');
  return {
    altText: plainSpaces(properties?.attributes.descr ?? ''),
    vector: elementsNamed(drawing, 'asvg:svgBlip').length === 1,
    raster: elementsNamed(drawing, 'a:blip').length === 1,
  };
}

function textOf(files: ReadonlyMap<string, Uint8Array>, path: string): string {
  const part = files.get(path);
  if (part === undefined) throw new Error(`The document has no ${path}.`);
  return new TextDecoder().decode(part);
}

function partOf(element: XmlElement): readonly DocumentPart[] {
  if (element.name === 'w:tbl') {
    const rows = elementsNamed(element, 'w:tr').map((row) =>
      elementsNamed(row, 'w:tc')
        .map(shown)
        .filter((text) => text !== ''),
    );
    return [{ kind: 'table', rows }];
  }
  if (element.name !== 'w:p') return [];
  const style = elementsNamed(element, 'w:pStyle')[0]?.attributes['w:val'] ?? '';
  return [{ kind: 'paragraph', style, text: shown(element) }];
}

/** The words that Word shows: instructions of fields are not part of them. */
function shown(element: XmlElement): string {
  return plainSpaces(wordsIn(element));
}

function wordsIn({ name, children }: XmlElement): string {
  if (name === 'w:t') return children.filter((child) => typeof child === 'string').join('');
  if (name === 'w:br' || name === 'w:tab') return ' ';
  const inner = children.map((child) => (typeof child === 'string' ? '' : wordsIn(child)));
  return inner.join('') + (name === 'w:p' ? ' ' : '');
}

function plainSpaces(text: string): string {
  return text.replace(/[\s\u00a0\u2002]+/g, ' ').trim();
}
