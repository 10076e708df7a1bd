import type { ValueAddress } from '#shared/analysis';
import type {
  CellNumber,
  ComposedReport,
  FigureElement,
  LayoutElement,
  Run,
  TableBodyCell,
  TableElement,
} from '#shared/layout';
import type { ExportRequest } from '../../server/exports/export-request';
import { houseStyle, phrasebook } from '../builders/house-styles';
import { SAMPLE_CODE_BOOK } from './sample-code-book';
import { TEST_FONTS } from './sample-request';

/** Labels of a laid report; tests put hostile ones in. */
export interface LaidLabels {
  readonly title: string;
  readonly words: string;
  readonly level: string;
  readonly category: string;
}

const PLAIN: LaidLabels = {
  title: 'A laid report',
  words: 'Words of the report.',
  level: 'Over 6 h',
  category: 'Kitchen',
};

/**
 * A report laid by hand, one of every element: what formats draw does not change with the wording.
 */
export function laidRequest(labels: Partial<LaidLabels> = {}): ExportRequest {
  return {
    report: laidReport({ ...PLAIN, ...labels }),
    houseStyle: houseStyle('compact-clinical'),
    phrasebook: phrasebook(),
    pins: [],
    codeBooks: [{ dataSetName: 'Survey', number: 1, codeBook: SAMPLE_CODE_BOOK }],
    study: { title: 'A laid study', invented: true },
    changedAt: '2026-02-03T23:30:00.000Z',
    fontDirectory: TEST_FONTS,
  };
}

function laidReport(labels: LaidLabels): ComposedReport {
  const runs: readonly Run[] = [{ text: labels.words }];
  const elements: readonly LayoutElement[] = [
    { kind: 'heading', blockId: 'h', level: 1, runs },
    {
      kind: 'paragraph',
      blockId: 'p',
      runs: [
        ...runs,
        { text: ' See ' },
        { text: 'Table\u00a01', reference: 't' },
        { text: ', ', marks: ['italic'] },
        { text: 'a page', link: 'https://example.org/' },
        { text: ' or a ' },
        { text: 'trap', link: 'javascript:alert(1)' },
      ],
    },
    {
      kind: 'list',
      blockId: 'l',
      ordered: true,
      items: [
        { depth: 0, ordered: true, runs },
        { depth: 1, ordered: false, runs },
      ],
    },
    laidTable(labels),
    laidFigure(labels),
    { kind: 'problem', blockId: 'x', message: labels.words },
  ];
  return { title: labels.title, elements, abbreviations: [] };
}

function laidTable({ words, level }: LaidLabels): TableElement {
  return {
    kind: 'table',
    blockId: 't',
    caption: { label: 'Table', number: 1, runs: [{ text: words }] },
    columns: [
      { id: 'level', align: 'start', width: 0.4, parts: [] },
      { id: 'count', align: 'end', width: 0.2, parts: parts('n', 'N') },
      { id: 'difference', align: 'end', width: 0.4, parts: parts('Points', 'Lower', 'Upper') },
    ],
    head: [
      [
        { runs: [{ text: level }], columnSpan: 1, rowSpan: 2, align: 'start' },
        { runs: [{ text: words }], columnSpan: 2, rowSpan: 1, align: 'center' },
      ],
      [
        { runs: [{ text: 'n/N' }], columnSpan: 1, rowSpan: 1, align: 'end' },
        { runs: [{ text: 'Points' }], columnSpan: 1, rowSpan: 1, align: 'end' },
      ],
    ],
    rows: [
      { kind: 'group', indent: 0, cells: [{ runs: [{ text: words }], numbers: [] }] },
      { kind: 'level', indent: 1, cells: [wordsCell(level), ...numbersCells()] },
      {
        kind: 'level',
        indent: 1,
        cells: [wordsCell('None'), wordsCell('–', 2), wordsCell('[Reference]', 3)],
      },
    ],
    notes: [[{ text: words }], [{ text: 'P', marks: ['italic'] }, { text: ' < .001' }]],
  };
}

function parts(...labels: readonly string[]): TableElement['columns'][number]['parts'] {
  return labels.map((label) => ({ id: label, label }));
}

function wordsCell(text: string, count = 0): TableBodyCell {
  return { runs: [{ text }], numbers: Array.from({ length: count }, () => null) };
}

function numbersCells(): readonly TableBodyCell[] {
  const events = number(34, 1, 0, '34');
  const total = number(12_163, 1, 0, '12\u202f163');
  const limits = [
    number(0.162, 100, 1, '+16.2', true),
    number(-0.0014, 100, 1, '−0.1', true),
    number(0.234, 100, 1, '+23.4', true),
  ];
  return [
    { runs: [{ text: '34/12\u202f163' }], numbers: [events, total] },
    { runs: [{ text: '+16.2 (−0.1 to +23.4)' }], numbers: limits },
  ];
}

function number(
  value: number,
  scale: number,
  decimals: number,
  text: string,
  signed = false,
): CellNumber {
  return { value, scale, decimals, signed, text, address: ADDRESS };
}

const ADDRESS: ValueAddress = {
  analysisId: 'a1',
  quantity: 'risk',
  levelId: null,
  scope: { kind: 'crude' },
  facet: 'value',
};

function laidFigure({ words, level, category }: LaidLabels): FigureElement {
  return {
    kind: 'figure',
    blockId: 'f',
    caption: { label: 'Figure', number: 1, runs: [{ text: words }] },
    figure: {
      kind: 'groupedBars',
      categories: [{ id: 'c', label: category, note: 'n = 163' }],
      groups: [{ id: 'g', label: level }],
      groupsLabel: 'Level',
      categoriesLabel: 'Place',
      valueLabel: 'Risk, %',
      valueScale: 100,
      decimalMark: '.',
      bars: [
        {
          categoryId: 'c',
          groupId: 'g',
          events: 34,
          total: 163,
          totalText: '163',
          value: 34 / 163,
          lower: 0.153,
          upper: 0.277,
          valueText: '20.9',
          addresses: [ADDRESS],
        },
      ],
      showValues: true,
      ordered: false,
    },
    altText: words,
    notes: [],
  };
}
