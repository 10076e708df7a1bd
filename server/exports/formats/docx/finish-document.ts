import { strFromU8, strToU8 } from 'fflate';
import { fixedZip, openZip, type ZipParts } from '../../fixed-zip';
import { PARAGRAPH_STYLES } from './document-styles';

/** What a document says about itself beside its text. */
export interface DocumentFacts {
  /** The moment of the last change, ISO 8601, UTC. */
  readonly changedAt: string;
  readonly language: string;
}

/**
 * Takes out of a document what differs from one making to the next (the moment, ids from counters
 * that never start again, the random ids of links), and adds what the library has no word for.
 */
export function finishDocument(bytes: Uint8Array, facts: DocumentFacts): Uint8Array {
  const parts = openZip(bytes);
  const body = textOf(parts, BODY);
  const links = linkIds(body);
  return fixedZip({
    ...parts,
    [BODY]: strToU8(steadyIds(body, links)),
    [RELATIONS]: strToU8(withLinkIds(textOf(parts, RELATIONS), links)),
    [PROPERTIES]: strToU8(withFacts(textOf(parts, PROPERTIES), facts)),
    [STYLES]: strToU8(withUnnumberedStyles(textOf(parts, STYLES))),
  });
}

const BODY = 'word/document.xml';
const RELATIONS = 'word/_rels/document.xml.rels';
const PROPERTIES = 'docProps/core.xml';
const STYLES = 'word/styles.xml';

function textOf(parts: ZipParts, path: string): string {
  const part = parts[path];
  if (part === undefined) throw new Error(`The document has no part ${path}.`);
  return strFromU8(part);
}

/** Links are numbered in the order of the text; pictures and the rest have steady ids already. */
function linkIds(body: string): ReadonlyMap<string, string> {
  const found = [...body.matchAll(/<w:hyperlink [^>]*r:id="([^"]+)"/g)].map(([, id]) => id ?? '');
  return new Map([...new Set(found)].map((id, index) => [id, `rIdLink${String(index + 1)}`]));
}

function steadyIds(body: string, links: ReadonlyMap<string, string>): string {
  const bookmarks = new Map<string, number>();
  let pictures = 0;
  return body.replace(
    /(<w:bookmark(?:Start|End)[^>]* w:id=")(\d+)|(<wp:docPr id=")\d+|(<w:hyperlink [^>]*r:id=")([^"]+)/g,
    (whole, mark?: string, id?: string, picture?: string, link?: string, linkId?: string) => {
      if (mark !== undefined && id !== undefined) return mark + String(numbered(id, bookmarks));
      if (picture !== undefined) return picture + String((pictures += 1));
      return link === undefined ? whole : link + (links.get(linkId ?? '') ?? '');
    },
  );
}

function numbered(id: string, numbers: Map<string, number>): number {
  const number = numbers.get(id) ?? numbers.size + 1;
  numbers.set(id, number);
  return number;
}

function withLinkIds(relations: string, links: ReadonlyMap<string, string>): string {
  return relations.replace(/ Id="([^"]+)"/g, (whole, id: string) =>
    links.has(id) ? ` Id="${links.get(id) ?? id}"` : whole,
  );
}

function withFacts(properties: string, { changedAt, language }: DocumentFacts): string {
  const seconds = `${changedAt.slice(0, 19)}Z`;
  return properties
    .replace(/(<dcterms:(?:created|modified)[^>]*>)[^<]*/g, (_, tag: string) => tag + seconds)
    .replace('</cp:coreProperties>', `<dc:language>${language}</dc:language>$&`);
}

/** Lines are numbered for reviewers of the text; what stands around it has no numbers. */
function withUnnumberedStyles(styles: string): string {
  return styles.replace(/<w:style [^>]*w:styleId="(\w+)".*?<\/w:style>/g, (style, id: string) =>
    UNNUMBERED.has(id) ? style.replace('<w:spacing ', '<w:suppressLineNumbers/>$&') : style,
  );
}

const UNNUMBERED: ReadonlySet<string> = new Set([
  PARAGRAPH_STYLES.caption,
  PARAGRAPH_STYLES.tableNote,
  PARAGRAPH_STYLES.figure,
  PARAGRAPH_STYLES.draft,
]);
