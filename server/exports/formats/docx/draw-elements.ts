import { HeadingLevel, ImageRun, Paragraph, type FileChild } from 'docx';
import type { HeadingElement, LayoutElement } from '#shared/layout';
import { drawElement, type Drawing, type ElementOf } from '../../drawing';
import { printableLine } from '../../printable-text';
import { continuation, drawCaption, drawNotes, SPACE_AFTER_NOTES } from './captions';
import type { DocumentContext } from './document-context';
import { PARAGRAPH_STYLES } from './document-styles';
import { drawList } from './draw-list';
import { drawTableGrid } from './draw-table';
import type { Orientation } from './page-setup';
import { panelsOf } from './table-panels';
import { settingOf, tightestSetting } from './table-plan';
import { drawRuns, textRuns } from './text-runs';

/** An element as paragraphs and tables, and the page that it needs. */
export interface DrawnElement {
  readonly orientation: Orientation;
  readonly children: readonly FileChild[];
}

/** Draws the elements of a report, each for the page that it fits. */
export function drawElements(
  elements: readonly LayoutElement[],
  context: DocumentContext,
): readonly DrawnElement[] {
  const drawing = documentDrawing(context);
  return elements.map((element) => drawElement(element, drawing));
}

function documentDrawing(context: DocumentContext): Drawing<DrawnElement> {
  const { bookmarks } = context;
  return {
    heading: ({ level, runs }) =>
      upright([
        new Paragraph({ heading: HEADINGS[level], children: [...drawRuns(runs, bookmarks)] }),
      ]),
    paragraph: ({ runs }) =>
      upright([
        new Paragraph({
          style: PARAGRAPH_STYLES.body,
          children: [...drawRuns(runs, bookmarks)],
        }),
      ]),
    list: (element) => upright(drawList(element, context)),
    table: (element) => drawTable(element, context),
    figure: (element) => upright(drawFigure(element, context)),
    problem: ({ message }) =>
      upright([
        new Paragraph({
          style: PARAGRAPH_STYLES.problem,
          children: [...textRuns(`[${message}]`)],
        }),
      ]),
  };
}

const HEADINGS = {
  1: HeadingLevel.HEADING_1,
  2: HeadingLevel.HEADING_2,
  3: HeadingLevel.HEADING_3,
} as const satisfies Readonly<Record<HeadingElement['level'], unknown>>;

function upright(children: readonly FileChild[]): DrawnElement {
  return { orientation: 'portrait', children };
}

/** A table that is too wide for any page is split into panels below each other. */
function drawTable(element: ElementOf<'table'>, context: DocumentContext): DrawnElement {
  const { houseStyle } = context;
  const { blockId, caption, notes } = element;
  const panels = panelsOf(element, (panel) => settingOf([panel], houseStyle) !== null);
  const setting = settingOf(panels, houseStyle) ?? tightestSetting(houseStyle);
  return {
    orientation: setting.orientation,
    children: [
      ...drawCaption(caption, { blockId, keepNext: true, follows: 'text' }, context),
      ...panels.flatMap((panel, index) => [
        ...(index === 0 ? [] : [continuation(caption)]),
        drawTableGrid(
          panel,
          { setting, notesFollow: index === panels.length - 1 && notes.length > 0 },
          context,
        ),
      ]),
      // A table needs a paragraph behind it, or the next table would grow into it.
      ...drawNotes(notes.length === 0 ? [[]] : notes, context),
    ],
  };
}

function drawFigure(element: ElementOf<'figure'>, context: DocumentContext): readonly FileChild[] {
  const { blockId, caption, notes } = element;
  const above = context.houseStyle.caption.figurePlace === 'above';
  const hasNotes = notes.length > 0;
  const words = drawCaption(
    caption,
    { blockId, keepNext: above || hasNotes, follows: above ? 'text' : 'picture' },
    context,
  );
  const picture = drawPicture(element, above ? hasNotes : true, context);
  const explained = drawNotes(notes, context);
  return above ? [...words, picture, ...explained] : [picture, ...words, ...explained];
}

function drawPicture(
  element: ElementOf<'figure'>,
  keepNext: boolean,
  { pictures }: DocumentContext,
): Paragraph {
  const picture = pictures.get(element);
  if (picture === undefined) throw new Error('A figure was not drawn before the document.');
  const { svg, png, width, height } = picture;
  const { label, number } = element.caption;
  return new Paragraph({
    style: PARAGRAPH_STYLES.figure,
    keepNext,
    ...(keepNext ? {} : { spacing: { after: SPACE_AFTER_NOTES } }),
    children: [
      new ImageRun({
        type: 'svg',
        data: Buffer.from(svg),
        fallback: { type: 'png', data: Buffer.from(png) },
        transformation: { width, height },
        altText: {
          name: `${label} ${String(number)}`,
          description: printableLine(element.altText),
        },
      }),
    ],
  });
}
