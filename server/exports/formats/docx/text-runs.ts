import { ExternalHyperlink, TextRun, type IRunOptions, type ParagraphChild } from 'docx';
import type { Run, RunMark } from '#shared/layout';
import { printableText } from '../../printable-text';
import { fieldRuns } from './fields';

/** How text looks beside what its runs say. */
export type TextLook = Pick<IRunOptions, 'bold' | 'italics' | 'size'>;

/** The bookmark of each table's and figure's number, by block id. */
export type Bookmarks = ReadonlyMap<string, string>;

/** Draws runs: styled text, links to the web, and cross-references as fields. */
export function drawRuns(
  runs: readonly Run[],
  bookmarks: Bookmarks,
  look: TextLook = {},
): readonly ParagraphChild[] {
  return joined(runs).flatMap((run) => drawRun(run, bookmarks, look));
}

/** Text in one style; line feeds are line breaks. */
export function textRuns(text: string, look: TextLook & RunLook = {}): readonly TextRun[] {
  const lines = printableText(text).split('\n');
  return lines.map((line, index) => {
    return new TextRun({ ...look, text: line, ...(index === 0 ? {} : { break: 1 }) });
  });
}

type RunLook = Pick<IRunOptions, 'superScript' | 'subScript' | 'style'>;

function drawRun(run: Run, bookmarks: Bookmarks, look: TextLook): readonly ParagraphChild[] {
  const styled = { ...look, ...looksOf(run.marks ?? []) };
  const bookmark = run.reference === undefined ? undefined : bookmarks.get(run.reference);
  if (bookmark !== undefined) {
    return fieldRuns(`REF ${bookmark} \\h \\* MERGEFORMAT`, printableText(run.text), styled);
  }
  const link = safeLink(run.link);
  if (link === null) return textRuns(run.text, styled);
  return [
    new ExternalHyperlink({
      link,
      children: [...textRuns(run.text, { ...styled, style: 'Hyperlink' })],
    }),
  ];
}

/** The secondary mark is for the screen: manuscripts are black. */
const LOOKS: Readonly<Record<RunMark, RunLook & TextLook>> = {
  bold: { bold: true },
  italic: { italics: true },
  superscript: { superScript: true },
  subscript: { subScript: true },
  secondary: {},
};

function looksOf(marks: readonly RunMark[]): RunLook & TextLook {
  return Object.assign({}, ...marks.map((mark) => LOOKS[mark])) as RunLook & TextLook;
}

/** A document leads to the web and to mail only, whatever its text says. */
function safeLink(link: string | undefined): string | null {
  const url = link !== undefined && URL.canParse(link) ? new URL(link) : null;
  return url !== null && SAFE_PROTOCOLS.includes(url.protocol) ? url.href : null;
}

const SAFE_PROTOCOLS: readonly string[] = ['http:', 'https:', 'mailto:'];

/** Neighbours that look alike become one run, so that words stay whole for who edits the file. */
function joined(runs: readonly Run[]): readonly Run[] {
  const result: Run[] = [];
  for (const run of runs) {
    const last = result.at(-1);
    if (last !== undefined && looksLike(last, run)) {
      result[result.length - 1] = { ...last, text: last.text + run.text };
    } else if (run.text !== '') {
      result.push(run);
    }
  }
  return result;
}

function looksLike(one: Run, other: Run): boolean {
  return (
    one.reference === undefined &&
    other.reference === undefined &&
    one.link === other.link &&
    printedMarks(one) === printedMarks(other)
  );
}

function printedMarks({ marks = [] }: Run): string {
  const printed = marks.filter((mark) => mark !== 'secondary');
  return printed.toSorted().join(' ');
}
