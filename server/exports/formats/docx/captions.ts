import { Bookmark, Paragraph, type ParagraphChild } from 'docx';
import type { CaptionStyle } from '#shared/house-style';
import type { Caption, Run } from '#shared/layout';
import type { DocumentContext } from './document-context';
import { PARAGRAPH_STYLES } from './document-styles';
import { fieldRuns } from './fields';
import { drawRuns, textRuns } from './text-runs';

/** What a caption belongs to, and whether it must stay on the page of what follows. */
export interface CaptionPlace {
  readonly blockId: string;
  readonly keepNext: boolean;
  readonly follows: 'text' | 'picture';
}

/**
 * The caption of a table or a figure: a sequence field for the number, bookmarked for the
 * cross-references, and the title behind it or on a line of its own.
 */
export function drawCaption(
  caption: Caption,
  place: CaptionPlace,
  { houseStyle, bookmarks }: DocumentContext,
): readonly Paragraph[] {
  const style = houseStyle.caption;
  const number = numberOf(caption, bookmarks.get(place.blockId), style);
  const title = drawRuns(caption.runs, bookmarks, { italics: style.italicTitle });
  const before = SPACE_BEFORE[place.follows];
  if (caption.runs.length === 0) return [captionParagraph(number, place, before)];
  if (style.lines === 'two') {
    return [
      captionParagraph(number, { keepNext: true }, before),
      captionParagraph(title, place, 0),
    ];
  }
  const between = textRuns(style.afterNumber, { bold: style.boldLabel });
  return [captionParagraph([...number, ...between, ...title], place, before)];
}

/** Stands over the second and later panels of a table that was split. */
export function continuation({ label, number }: Caption): Paragraph {
  const words = textRuns(`${label}\u00a0${String(number)}, continued`, { italics: true });
  return captionParagraph(words, { keepNext: true }, SPACE_BEFORE.text);
}

/** The runs of notes, each a paragraph; all but the last stay together. */
export function drawNotes(
  notes: readonly (readonly Run[])[],
  { bookmarks }: DocumentContext,
): readonly Paragraph[] {
  return notes.map((note, index) => {
    return new Paragraph({
      style: PARAGRAPH_STYLES.tableNote,
      keepNext: index < notes.length - 1,
      ...(index === notes.length - 1 ? { spacing: { after: SPACE_AFTER_NOTES } } : {}),
      children: [...drawRuns(note, bookmarks)],
    });
  });
}

/** Twips between the last note and what follows. */
export const SPACE_AFTER_NOTES = 280;

/** Twips between a caption and what stands before it. */
const SPACE_BEFORE = { text: 240, picture: 40 } as const;

function numberOf(
  { label, number }: Caption,
  bookmark: string | undefined,
  { boldLabel }: CaptionStyle,
): readonly ParagraphChild[] {
  const look = { bold: boldLabel };
  const children = [
    ...textRuns(`${label}\u00a0`, look),
    ...fieldRuns(`SEQ ${label} \\* ARABIC`, String(number), look),
  ];
  return bookmark === undefined ? children : [new Bookmark({ id: bookmark, children })];
}

function captionParagraph(
  children: readonly ParagraphChild[],
  { keepNext }: Pick<CaptionPlace, 'keepNext'>,
  before: number,
): Paragraph {
  return new Paragraph({
    style: PARAGRAPH_STYLES.caption,
    keepNext,
    spacing: { before },
    children: [...children],
  });
}
