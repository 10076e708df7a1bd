import { Document, Packer } from 'docx';
import type { HouseStyle } from '#shared/house-style';
import type { FigureElement, LayoutElement } from '#shared/layout';
import type { ExportRequest } from '../../export-request';
import { figureSvg } from '../../figures/draw-figure';
import { openFigureFonts } from '../../figures/figure-fonts';
import { figurePicture, type FigurePicture } from '../../figures/figure-picture';
import { printAppearance } from '../../figures/print-appearance';
import { printableLine } from '../../printable-text';
import type { DocumentContext } from './document-context';
import { documentSections } from './document-sections';
import { documentStyles } from './document-styles';
import { drawElements } from './draw-elements';
import { listNumbering } from './draw-list';
import { textWidthInPoints } from './page-setup';
import { finishDocument } from './finish-document';
import type { Bookmarks } from './text-runs';

/** Makes a Word document of a composed report. */
export async function renderDocx(request: ExportRequest): Promise<Uint8Array> {
  const { report, houseStyle } = request;
  const context = await contextOf(request);
  const title = printableLine(report.title);
  const document = new Document({
    title,
    subject: printableLine(request.study.title),
    creator: 'Evenhand',
    lastModifiedBy: 'Evenhand',
    description: 'Draft made from stored analyses.',
    styles: documentStyles(houseStyle),
    numbering: listNumbering(),
    features: { updateFields: false },
    sections: documentSections(title, drawElements(report.elements, context), request),
  });
  const { changedAt } = request;
  const { language } = houseStyle;
  return finishDocument(await Packer.toBuffer(document), { changedAt, language });
}

async function contextOf(request: ExportRequest): Promise<DocumentContext> {
  const { report, houseStyle } = request;
  let lists = 0;
  return {
    houseStyle,
    bookmarks: bookmarksOf(report.elements),
    pictures: await picturesOf(report.elements, request),
    nextList: () => (lists += 1),
  };
}

/** Word hides bookmarks whose name begins so; ids of blocks could be too long for a name. */
function bookmarksOf(elements: readonly LayoutElement[]): Bookmarks {
  const blockIds = elements
    .filter(({ kind }) => kind === 'table' || kind === 'figure')
    .map(({ blockId }) => blockId);
  const unique = [...new Set(blockIds)];
  return new Map(unique.map((id, index) => [id, `_Ref${String(100_000_001 + index)}`]));
}

async function picturesOf(
  elements: readonly LayoutElement[],
  { fontDirectory, houseStyle }: ExportRequest,
): Promise<ReadonlyMap<FigureElement, FigurePicture>> {
  const figures = elements.filter((element) => element.kind === 'figure');
  const pictures = new Map<FigureElement, FigurePicture>();
  if (figures.length === 0) return pictures;
  const fonts = openFigureFonts(fontDirectory);
  for (const element of figures) {
    const appearance = printAppearance(element.figure, houseStyle.figure, roomFor(houseStyle));
    const svg = await figureSvg(element.figure, appearance);
    pictures.set(element, figurePicture(svg, fonts, houseStyle.figure.dotsPerInch));
  }
  return pictures;
}

function roomFor(houseStyle: HouseStyle): number {
  return (textWidthInPoints(houseStyle, 'portrait') * 25.4) / 72;
}
