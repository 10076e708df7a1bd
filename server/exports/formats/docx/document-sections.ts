import {
  AlignmentType,
  Footer,
  Header,
  HeadingLevel,
  LineNumberRestartFormat,
  PageNumber,
  PageOrientation,
  Paragraph,
  SectionType,
  TextRun,
  type FileChild,
  type ISectionOptions,
} from 'docx';
import type { HouseStyle } from '#shared/house-style';
import { draftLabel, draftLines } from '../../draft-words';
import type { ExportRequest } from '../../export-request';
import { PARAGRAPH_STYLES } from './document-styles';
import type { DrawnElement } from './draw-elements';
import { marginInTwips, paperSize, type Orientation } from './page-setup';
import { textRuns } from './text-runs';

/**
 * The sections of a document: upright pages, and pages on their side for the tables that need the
 * width. Neighbours that stand alike share a section.
 */
export function documentSections(
  title: string,
  elements: readonly DrawnElement[],
  request: ExportRequest,
): readonly ISectionOptions[] {
  const opening: DrawnElement = { orientation: 'portrait', children: opened(title, request) };
  return gathered([opening, ...elements]).map(({ orientation, children }) => ({
    properties: sectionProperties(request.houseStyle, orientation),
    headers: { default: pageHead(request) },
    footers: { default: pageFoot() },
    children,
  }));
}

function opened(title: string, request: ExportRequest): readonly FileChild[] {
  const lines = draftLines(request);
  return [
    new Paragraph({ heading: HeadingLevel.TITLE, children: [...textRuns(title)] }),
    ...lines.map((line, index) => {
      return new Paragraph({
        style: PARAGRAPH_STYLES.draft,
        ...(index === lines.length - 1 ? { spacing: { after: 280 } } : {}),
        children: [...textRuns(line)],
      });
    }),
  ];
}

interface Gathered {
  readonly orientation: Orientation;
  readonly children: FileChild[];
}

function gathered(elements: readonly DrawnElement[]): readonly Gathered[] {
  const sections: Gathered[] = [];
  for (const { orientation, children } of elements) {
    const present = sections.at(-1);
    if (present?.orientation === orientation) present.children.push(...children);
    else sections.push({ orientation, children: [...children] });
  }
  return sections;
}

function sectionProperties(
  { page }: HouseStyle,
  orientation: Orientation,
): NonNullable<ISectionOptions['properties']> {
  const margin = marginInTwips(page);
  return {
    type: SectionType.NEXT_PAGE,
    page: {
      size: { ...paperSize(page), orientation: ORIENTATIONS[orientation] },
      margin: { top: margin, right: margin, bottom: margin, left: margin },
    },
    ...(page.lineNumbers
      ? { lineNumbers: { countBy: 1, restart: LineNumberRestartFormat.CONTINUOUS } }
      : {}),
  };
}

const ORIENTATIONS = {
  portrait: PageOrientation.PORTRAIT,
  landscape: PageOrientation.LANDSCAPE,
} as const satisfies Readonly<Record<Orientation, unknown>>;

function pageHead(request: ExportRequest): Header {
  return new Header({ children: [edgeParagraph(textRuns(draftLabel(request)))] });
}

function pageFoot(): Footer {
  const number = new TextRun({ children: [PageNumber.CURRENT] });
  return new Footer({ children: [edgeParagraph([number])] });
}

function edgeParagraph(children: readonly TextRun[]): Paragraph {
  return new Paragraph({
    style: PARAGRAPH_STYLES.draft,
    alignment: AlignmentType.RIGHT,
    children: [...children],
  });
}
