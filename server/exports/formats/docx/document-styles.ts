import { LineRuleType, type IParagraphStyleOptions, type IStylesOptions } from 'docx';
import type { HouseStyle } from '#shared/house-style';
import { twips } from './page-setup';

/** Ids of the paragraph styles that a document uses. */
export const PARAGRAPH_STYLES = {
  title: 'Title',
  body: 'BodyText',
  caption: 'Caption',
  tableText: 'TableText',
  tableHead: 'TableHead',
  tableNote: 'TableNote',
  figure: 'Figure',
  bulletList: 'ListBullet',
  numberList: 'ListNumber',
  draft: 'DraftNote',
  problem: 'Problem',
} as const;

/** The Word styles of a house style. Sizes are half points, spaces twips. */
export function documentStyles(style: HouseStyle): IStylesOptions {
  const { page, language } = style;
  const body = page.bodySizeInPoints;
  return {
    default: {
      document: {
        run: {
          font: page.bodyFont,
          size: half(body),
          sizeComplexScript: half(body),
          language: { value: language },
        },
        paragraph: { spacing: singleLine(0, 0) },
      },
      title: heading(style, { size: body + 6, before: 0, after: 10, level: null }),
      heading1: heading(style, { size: body + 3, before: 16, after: 6, level: 0 }),
      heading2: heading(style, { size: body + 1, before: 12, after: 4, level: 1 }),
      heading3: heading(style, { size: body, before: 10, after: 4, level: 2 }),
    },
    paragraphStyles: [...textStyles(style), ...tableStyles(style)],
  };
}

type HeadingStyle = NonNullable<NonNullable<IStylesOptions['default']>['heading1']>;

interface HeadingLook {
  readonly size: number;
  readonly before: number;
  readonly after: number;
  readonly level: 0 | 1 | 2 | null;
}

function heading({ page }: HouseStyle, { size, before, after, level }: HeadingLook): HeadingStyle {
  return {
    run: {
      font: page.headingFont,
      size: half(size),
      bold: true,
      italics: level === 2,
      color: 'auto',
    },
    paragraph: {
      spacing: singleLine(before, after),
      keepNext: true,
      keepLines: true,
      ...(level === null ? {} : { outlineLevel: level }),
    },
  };
}

function textStyles({ page }: HouseStyle): readonly IParagraphStyleOptions[] {
  const line = Math.round(240 * page.lineSpacing);
  const running = { line, lineRule: LineRuleType.AUTO, before: 0, after: twips(6) };
  const list = { ...running, after: twips(3) };
  return [
    paragraph('body', 'Body Text', { paragraph: { spacing: running } }),
    paragraph('bulletList', 'List Bullet', { paragraph: { spacing: list } }),
    paragraph('numberList', 'List Number', { paragraph: { spacing: list } }),
    paragraph('problem', 'Problem', {
      run: { bold: true, color: 'A02020' },
      paragraph: { spacing: running },
    }),
    paragraph('draft', 'Draft Note', {
      run: { font: page.tableFont, size: half(page.tableSizeInPoints), color: '505050' },
      paragraph: { spacing: singleLine(0, 3) },
    }),
  ];
}

function tableStyles({ page }: HouseStyle): readonly IParagraphStyleOptions[] {
  const run = { font: page.tableFont, size: half(page.tableSizeInPoints) };
  return [
    paragraph('caption', 'caption', {
      run: { ...run, size: half(page.tableSizeInPoints + 1), bold: false, color: 'auto' },
      paragraph: { spacing: singleLine(12, 4), keepLines: true },
    }),
    paragraph('tableText', 'Table Text', { run, paragraph: { spacing: singleLine(1, 1) } }),
    paragraph('tableHead', 'Table Head', {
      run: { ...run, bold: true },
      paragraph: { spacing: singleLine(2, 2), keepNext: true },
    }),
    paragraph('tableNote', 'Table Note', {
      run: { ...run, size: half(Math.max(SMALLEST_NOTE, page.tableSizeInPoints - 1)) },
      paragraph: { spacing: singleLine(2, 0), keepLines: true },
    }),
    paragraph('figure', 'Figure', { paragraph: { spacing: singleLine(12, 4) } }),
  ];
}

const SMALLEST_NOTE = 7;

function paragraph(
  name: keyof typeof PARAGRAPH_STYLES,
  label: string,
  look: Pick<IParagraphStyleOptions, 'run' | 'paragraph'>,
): IParagraphStyleOptions {
  return {
    id: PARAGRAPH_STYLES[name],
    name: label,
    basedOn: 'Normal',
    quickFormat: true,
    ...look,
  };
}

/** Lines of single height; the rule is named because without it readers clip pictures. */
function singleLine(
  before: number,
  after: number,
): {
  readonly line: number;
  readonly lineRule: typeof LineRuleType.AUTO;
  readonly before: number;
  readonly after: number;
} {
  return { line: 240, lineRule: LineRuleType.AUTO, before: twips(before), after: twips(after) };
}

function half(points: number): number {
  return Math.round(points * 2);
}
