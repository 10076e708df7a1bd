import { posix } from 'node:path';
import { LIMITS } from '../limits';
import { entryBytes, type UnpackBudget } from './entry-bytes';
import { formatMeaning, type FormatMeaning } from './number-formats';
import { attributeOf, parseXml, type XmlEvents } from './parse-xml';
import { damaged, ReadingStopped } from './reading-stopped';
import { TextGatherer } from './text-gatherer';
import { TextList } from './text-list';
import type { ZipArchive, ZipEntry } from './zip-entries';

/** A sheet that holds cells, in the order of the workbook. */
export interface SheetPart {
  readonly name: string;
  readonly hidden: boolean;
  readonly entry: ZipEntry;
}

/** A workbook opened: its sheets, and what their cells refer to. */
export interface OpenedWorkbook {
  readonly archive: ZipArchive;
  readonly budget: UnpackBudget;
  readonly sheets: readonly SheetPart[];
  readonly calendar: '1900' | '1904';
  /** What the number format of each cell style means. */
  readonly styles: readonly FormatMeaning[];
  readonly sharedTexts: TextList;
}

/** Reads everything of a workbook but its sheets (ISO/IEC 29500-1 and -2). */
export async function openWorkbook(
  archive: ZipArchive,
  budget: UnpackBudget,
  pause: () => Promise<void>,
): Promise<OpenedWorkbook> {
  const place = { archive, budget, pause };
  const [main] = (await readRelations(place, '')).filter(({ type }) => type === 'officeDocument');
  if (main === undefined) throw damaged('list of parts');
  const relations = await readRelations(place, main.target);
  const { listed, calendar } = await readWorkbookPart(place, main.target);
  const targetOf = (type: string): string | undefined =>
    relations.find((relation) => relation.type === type)?.target;
  const sheets = listed.flatMap(({ name, hidden, relationId }) => {
    const relation = relations.find(({ id, type }) => id === relationId && type === 'worksheet');
    return relation === undefined
      ? []
      : [{ name, hidden, entry: partEntry(archive, relation.target) }];
  });
  return {
    archive,
    budget,
    sheets,
    calendar,
    styles: await readStyles(place, targetOf('styles')),
    sharedTexts: await readSharedTexts(place, targetOf('sharedStrings')),
  };
}

interface Place {
  readonly archive: ZipArchive;
  readonly budget: UnpackBudget;
  /** Waited for between chunks. */
  readonly pause: () => Promise<void>;
}

function partEntry(archive: ZipArchive, name: string): ZipEntry {
  const entry = archive.entries.get(name.toLowerCase());
  if (entry === undefined) throw damaged(`the missing part "${name}"`);
  return entry;
}

async function parsePart(
  { archive, budget, pause }: Place,
  name: string,
  events: XmlEvents,
): Promise<void> {
  const bytes = entryBytes(archive, partEntry(archive, name), budget);
  await parseXml(name, bytes, { ...events, pause });
}

interface Relation {
  readonly id: string;
  /** The last word of the relation's type. */
  readonly type: string;
  readonly target: string;
}

/** What a part refers to; the empty name stands for the package itself. */
async function readRelations(place: Place, part: string): Promise<readonly Relation[]> {
  const { dir, base } = posix.parse(part);
  const name = posix.join(dir, '_rels', `${base}.rels`);
  const relations: Relation[] = [];
  if (!place.archive.entries.has(name.toLowerCase())) return relations;
  await parsePart(place, name, {
    open: (element, attributes) => {
      if (element !== 'Relationship' || attributes.TargetMode === 'External') return;
      const target = attributes.Target ?? '';
      relations.push({
        id: attributes.Id ?? '',
        type: (attributes.Type ?? '').split('/').at(-1) ?? '',
        target: target.startsWith('/') ? target.slice(1) : posix.join(dir, target),
      });
    },
  });
  return relations;
}

interface ListedSheet {
  readonly name: string;
  readonly hidden: boolean;
  readonly relationId: string;
}

async function readWorkbookPart(
  place: Place,
  part: string,
): Promise<{ readonly listed: readonly ListedSheet[]; readonly calendar: '1900' | '1904' }> {
  const listed: ListedSheet[] = [];
  let calendar: '1900' | '1904' = '1900';
  await parsePart(place, part, {
    open: (element, attributes) => {
      if (element === 'workbookPr' && isTrue(attributes.date1904)) calendar = '1904';
      if (element !== 'sheet') return;
      const relationId = attributeOf(attributes, 'id');
      const state = attributes.state ?? 'visible';
      listed.push({ name: attributes.name ?? '', hidden: state !== 'visible', relationId });
    },
  });
  return { listed, calendar };
}

/** Whether an attribute of XML Schema's boolean type is set. */
export function isTrue(value: string | undefined): boolean {
  return value === '1' || value === 'true';
}

async function readStyles(
  place: Place,
  part: string | undefined,
): Promise<readonly FormatMeaning[]> {
  if (part === undefined) return [];
  const codes = new Map<number, string>();
  const styles: FormatMeaning[] = [];
  let inCellStyles = false;
  await parsePart(place, part, {
    open: (element, attributes) => {
      if (element === 'numFmt') {
        codes.set(Number(attributes.numFmtId), attributes.formatCode ?? '');
      } else if (element === 'cellXfs') inCellStyles = true;
      else if (element === 'xf' && inCellStyles) {
        const id = Number(attributes.numFmtId ?? 0);
        styles.push(formatMeaning(id, codes.get(id)));
      }
    },
    close: (element) => {
      if (element === 'cellXfs') inCellStyles = false;
    },
  });
  return styles;
}

async function readSharedTexts(place: Place, part: string | undefined): Promise<TextList> {
  const texts = new TextList();
  if (part === undefined) return texts;
  const gatherer = new TextGatherer();
  await parsePart(place, part, {
    open: (element) => {
      gatherer.open(element);
    },
    text: (text) => {
      gatherer.text(text);
    },
    close: (element) => {
      gatherer.close(element);
      if (element !== 'si') return;
      texts.push(gatherer.take());
      if (texts.byteLength > LIMITS.sharedTextBytes) {
        throw new ReadingStopped({ code: 'workbookTooLarge' });
      }
    },
  });
  return texts;
}
