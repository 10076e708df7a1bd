import { describe, expect, it } from 'vitest';
import { addressKey } from '#shared/analysis';
import type { LayoutElement, TableElement } from '#shared/layout';
import { createComposer, valueLedger } from '#shared/report';
import type { Block, PinnedAnalysis, Report } from '#shared/report';
import type { TextDocument } from '#shared/report/text';
import type { Framing } from '#shared/wording';
import { houseStyle, phrasebook } from '../builders/house-styles';
import { blockOf, composed, elementOf, pinned, reportOf, textOf } from '../builders/reports';
import { emptyStratumResult, wardResult, wetWorkResult } from '../builders/results';

const WET_WORK = pinned(wetWorkResult());
const WARD = pinned(wardResult(), 'a2');

describe('the second pass', () => {
  const blocks = [
    prose('p1', [referenceTo('t2'), textNode(' and '), referenceTo('f1'), textNode('.')]),
    blockOf('t1', 'stratifiedTable', WET_WORK),
    blockOf('f1', 'groupedBarChart', WET_WORK),
    blockOf('t2', 'stratifiedTable', WARD),
    prose('p2', [referenceTo('p1')]),
  ];
  const pins = [WET_WORK, WARD];

  it('numbers tables and figures apart, in the order of print', () => {
    const { elements } = composed(reportOf(blocks, pins), pins);
    expect(captionsOf(elements)).toEqual(['t1 Table 1', 'f1 Figure 1', 't2 Table 2']);
  });

  it('writes cross-references, before and after what they refer to', () => {
    const [first] = composed(reportOf(blocks, pins), pins).elements;
    expect(wordsOf(first)).toBe('Table\u00a02 and Figure\u00a01.');
  });

  it('says that a reference leads nowhere', () => {
    const printed = composed(reportOf(blocks, pins), pins);
    const last = printed.elements.at(-1);
    expect(wordsOf(last)).toBe('[table or figure removed]');
    expect(last).toMatchObject({ runs: [{ origin: { state: 'missing', blockId: 'p2' } }] });
  });

  it('numbers again when a table goes, and leaves no number behind', () => {
    const report = reportOf(blocks, pins);
    const without = report.blocks.map((block) =>
      block.id === 't1' ? { ...block, removedAt: '2026-03-01T00:00:00Z' } : block,
    );
    const { elements } = composed({ ...report, blocks: without }, pins);
    expect(captionsOf(elements)).toEqual(['f1 Figure 1', 't2 Table 1']);
    expect(wordsOf(elements[0])).toBe('Table\u00a01 and Figure\u00a01.');
  });

  it('writes an abbreviation out at its first use in running text only', () => {
    const sentences = [
      blockOf('s1', 'effectSentence', WARD),
      blockOf('s2', 'effectSentence', WARD),
    ];
    const { elements, abbreviations } = composed(reportOf(sentences, pins), pins);
    expect(wordsOf(elements[0]).split('confidence interval [CI]')).toHaveLength(2);
    expect(wordsOf(elements[0])).toContain('95%\u00a0CI');
    expect(wordsOf(elements[1])).not.toContain('confidence interval');
    expect(abbreviations).toEqual([{ short: 'CI', long: 'confidence interval' }]);
  });

  it('explains abbreviations in every table', () => {
    const { elements } = composed(reportOf(blocks, pins), pins);
    const tables = elements.filter((element) => element.kind === 'table');
    for (const { notes } of tables) {
      expect(notes.map(textOf)).toContain('CI, confidence interval.');
    }
  });
});

describe('what is missing', () => {
  it('shows no number of a result that the report does not name', () => {
    const report = reportOf([blockOf('t1', 'stratifiedTable', WET_WORK)], [WET_WORK]);
    const moved: Report = { ...report, pins: { a1: 'a newer result' } };
    expect(composed(moved, [WET_WORK]).elements).toMatchObject([
      { kind: 'problem', blockId: 't1' },
    ]);
  });

  it.each([
    ['a level that is gone', { indexLevelId: 'gone' }],
    ['a stratum that is gone', { scope: { kind: 'stratum', stratumId: 'gone' } }],
    ['the reference itself', { indexLevelId: 'none' }],
  ])('says so for a sentence about %s', (_name, changes) => {
    const block = blockOf('s1', 'effectSentence', WET_WORK, changes);
    const printed = composed(reportOf([block], [WET_WORK]), [WET_WORK]);
    expect(printed.elements).toMatchObject([{ kind: 'problem', blockId: 's1' }]);
    expect(valueLedger(printed)).toEqual([]);
  });

  it.each([
    ['an analysis', 'a9/risk/none/crude/value'],
    ['a level', 'a1/risk/gone/crude/value'],
    ['an address', 'nonsense'],
  ])('says so for a value in prose of %s that is gone', (_name, address) => {
    const block = prose('p1', [{ type: 'boundValue', attrs: { address, format: 'auto' } }]);
    const [paragraph] = composed(reportOf([block], [WET_WORK]), [WET_WORK]).elements;
    expect(wordsOf(paragraph)).toMatch(/^\[.+\]$/u);
    expect(paragraph).toMatchObject({ runs: [{ origin: { state: 'missing' } }] });
  });

  it('names the stratum that the pooled estimates leave out', () => {
    const analysis = pinned(emptyStratumResult());
    const table = tableOf(blockOf('t1', 'stratifiedTable', analysis), analysis);
    expect(table.notes.map(textOf).join(' ')).toMatch(/kitchens: .*left out of the pooled/iu);
  });
});

describe('a value in prose', () => {
  it.each([
    ['a1/risk/over6/crude/value', 'auto', '21.2%'],
    ['a1/risk/over6/crude/value', 'count', '81 of 382'],
    ['a1/risk/over6/crude/value', 'per100', '21 per\u00a0100'],
    ['a1/risk/over6/crude/value', 'per1000', '212 per\u00a01,000'],
    [
      'a1/risk/over6/crude/value',
      'withLimits',
      '21.2% (95%\u00a0confidence interval [CI] 17.4% to 25.6%)',
    ],
    ['a1/events/over6/crude/value', 'auto', '81'],
    ['a1/counted/@all/crude/value', 'auto', '1309'],
    ['a1/riskDifference/over6/stratum:ward/value', 'auto', '+16.2\u00a0percentage points'],
    ['a1/riskDifference/over6/stratum:ward/upper', 'auto', '23.4\u00a0percentage points'],
    ['a1/riskDifference/over6/stratum:ward/value', 'per100', '+16 per\u00a0100'],
    ['a1/riskRatio/over6/stratum:ward/value', 'auto', '4.48'],
    ['a1/riskRatio/over6/stratum:ward/value', 'count', '4.48'],
    ['a1/trend/@all/stratum:ward/pValue', 'auto', 'P<0.001'],
  ])('%s as %s reads “%s”', (address, format, text) => {
    const node = { type: 'boundValue', attrs: { address, format } };
    const block = prose('p1', [node]);
    const [paragraph] = composed(reportOf([block], [WET_WORK]), [WET_WORK]).elements;
    expect(wordsOf(paragraph)).toBe(text);
  });

  it('is drawn once the analysis is pinned, and counts as shown by the block', () => {
    const block = prose('p1', [
      { type: 'boundValue', attrs: { address: 'a2/total/none/crude/value', format: 'auto' } },
    ]);
    const printed = composed(reportOf([block], [WARD]), [WARD]);
    expect(valueLedger(printed)).toMatchObject([{ blockId: 'p1', text: '236' }]);
  });
});

describe('a stratified table', () => {
  it('stands side by side when its columns fit, with a spanner for each stratum', () => {
    const table = tableOf(choosing({ pooled: false }), WET_WORK);
    expect(table.head.map((row) => row.map(({ runs }) => textOf(runs)))).toEqual([
      ['Wet work per shift', 'hospital wards (N\u00a0=\u00a0801)', 'kitchens (N\u00a0=\u00a0508)'],
      Array.from({ length: 2 }, () => [
        'n/N',
        'Risk, %',
        'Difference, points (95%\u00a0CI)',
        'Risk ratio (95%\u00a0CI)',
      ]).flat(),
    ]);
    expect(cellsOf(table, 2).slice(0, 5)).toEqual([
      'Over 6 h',
      '34/163',
      '20.9',
      '+16.2 (9.7 to 23.4)',
      '4.48 (2.34 to 8.57)',
    ]);
  });

  it('stacks the strata when it would grow too wide, each under its head', () => {
    const table = tableOf(choosing({}), WET_WORK);
    const heads = table.rows.filter(({ kind }) => kind === 'group').map(({ cells }) => cells);
    expect(heads.map(([cell]) => textOf(cell?.runs ?? []))).toEqual([
      'hospital wards (N\u00a0=\u00a0801)',
      'kitchens (N\u00a0=\u00a0508)',
      'Adjusted for workplace',
    ]);
  });

  it.each<[Framing, readonly string[]]>([
    ['absolute', ['n/N', 'Risk, %', 'Difference, points (95%\u00a0CI)']],
    ['relative', ['n/N', 'Risk, %', 'Risk ratio (95%\u00a0CI)']],
    ['both', ['n/N', 'Risk, %', 'Difference, points (95%\u00a0CI)', 'Risk ratio (95%\u00a0CI)']],
  ])('shows under the framing “%s” the columns %j', (framing, columns) => {
    const block = blockOf('t1', 'stratifiedTable', WARD);
    const table = elementOf(composed(reportOf([block], [WARD], framing), [WARD]), 'table');
    expect(
      table.head
        .at(-1)
        ?.slice(1)
        .map(({ runs }) => textOf(runs)),
    ).toEqual(columns);
  });

  it('keeps its rows where they are when the framing changes', () => {
    const rowsUnder = (framing: Framing): readonly string[] => {
      const printed = composed(reportOf([choosing({})], [WET_WORK], framing), [WET_WORK]);
      return elementOf(printed, 'table').rows.map(
        ({ kind, cells }) => `${kind} ${textOf(cells[0]?.runs ?? [])}`,
      );
    };
    expect(rowsUnder('absolute')).toEqual(rowsUnder('both'));
    expect(rowsUnder('relative')).toEqual(rowsUnder('both'));
  });

  it('counts cases and controls, and gives odds ratios only, where the design asks', () => {
    const analysis = pinned(wetWorkResult({ design: 'caseControl' }));
    for (const framing of ['absolute', 'both', 'relative'] as const) {
      const report = reportOf([blockOf('t1', 'stratifiedTable', analysis)], [analysis], framing);
      const table = elementOf(composed(report, [analysis]), 'table');
      expect(
        table.head
          .at(-1)
          ?.map(({ runs }) => textOf(runs))
          .slice(1, 6),
      ).toEqual(['Cases, n', 'Cases, %', 'Controls, n', 'Controls, %', 'Odds ratio (95%\u00a0CI)']);
      expect(cellsOf(table, 3).slice(1, 5)).toEqual(['34', '47', '129', '18']);
    }
  });

  it('has a cell for every column, a number for every part, and widths that fill the page', () => {
    for (const block of [choosing({}), choosing({ pooled: false }), choosing({ crude: true })]) {
      const table = tableOf(block, WET_WORK);
      expect(table.columns.reduce((sum, { width }) => sum + width, 0)).toBeCloseTo(1, 12);
      for (const row of table.rows.filter(({ kind }) => kind !== 'group')) {
        expect(row.cells).toHaveLength(table.columns.length);
        row.cells.forEach(({ numbers }, index) => {
          expect(numbers).toHaveLength(table.columns[index]?.parts.length ?? -1);
        });
      }
      for (const row of table.head) {
        const spanned = row.reduce((sum, { columnSpan }) => sum + columnSpan, 0);
        expect([table.columns.length, table.columns.length - 1]).toContain(spanned);
      }
    }
  });

  it('keeps numbers as numbers beside their text', () => {
    const table = tableOf(blockOf('t1', 'stratifiedTable', WARD), WARD);
    const [, count, share, difference] = table.rows[2]?.cells ?? [];
    expect(count?.numbers.map((number) => number?.value)).toEqual([34, 163]);
    expect(share?.numbers[0]).toMatchObject({ value: 34 / 163, scale: 100, decimals: 1 });
    expect(difference?.numbers[0]).toMatchObject({ text: '+16.2', scale: 100, signed: true });
  });

  it('takes a title of the writer’s own', () => {
    const title = { type: 'doc', content: [{ type: 'paragraph', content: [textNode('Mine')] }] };
    const table = tableOf(blockOf('t1', 'stratifiedTable', WARD, { title }), WARD);
    expect(textOf(table.caption.runs)).toBe('Mine');
  });
});

describe('one source', () => {
  it('prints every value alike wherever it is printed', () => {
    const blocks = [
      blockOf('t1', 'stratifiedTable', WET_WORK),
      blockOf('f1', 'groupedBarChart', WET_WORK),
      blockOf('s1', 'effectSentence', WET_WORK),
      blockOf('s2', 'effectSentence', WET_WORK, { scope: { kind: 'stratum', stratumId: 'ward' } }),
    ];
    const ledger = valueLedger(composed(reportOf(blocks, [WET_WORK]), [WET_WORK]));
    const printed = new Map<string, Set<string>>();
    for (const { address, text } of ledger) {
      const key = addressKey(address);
      const figures = text.replace(/[+−%]/gu, '');
      printed.set(key, (printed.get(key) ?? new Set()).add(figures));
    }
    const differing = [...printed].filter(([, texts]) => texts.size > 1);
    expect(differing).toEqual([]);
    expect(ledger.length).toBeGreaterThan(80);
  });

  it('draws bars in the order of the table and with its figures', () => {
    const blocks = [choosing({ pooled: false }), blockOf('f1', 'groupedBarChart', WET_WORK)];
    const printed = composed(reportOf(blocks, [WET_WORK]), [WET_WORK]);
    const table = elementOf(printed, 'table');
    const { figure } = elementOf(printed, 'figure');
    const risks = table.rows.flatMap(({ cells }) =>
      [cells[2], cells[6]].map((cell) => textOf(cell?.runs ?? [])),
    );
    expect(figure.bars.map(({ valueText }) => valueText)).toEqual(risks);
  });

  it('shows a case–control chart as shares of all cases and of all controls', () => {
    const analysis = pinned(wetWorkResult({ design: 'caseControl' }));
    const report = reportOf([blockOf('f1', 'groupedBarChart', analysis)], [analysis]);
    const { figure, altText } = elementOf(composed(report, [analysis]), 'figure');
    expect(figure.groups.map(({ label }) => label)).toEqual(['Cases', 'Controls']);
    const cases = figure.bars.filter(({ groupId }) => groupId === 'cases');
    expect(cases.reduce((sum, { value }) => sum + (value ?? 0), 0)).toBeCloseTo(1, 12);
    expect(cases.every(({ total, lower }) => total === 132 && lower !== null)).toBe(true);
    expect(altText).not.toContain('within workplace');
  });
});

describe('the composer’s memory', () => {
  const blocks = [
    blockOf('t1', 'stratifiedTable', WET_WORK),
    prose('p1', [textNode('See '), referenceTo('t1')]),
    blockOf('s1', 'effectSentence', WARD),
  ];
  const pins = [WET_WORK, WARD];
  const style = houseStyle();
  const book = phrasebook();

  function compose(composer: ReturnType<typeof createComposer>, report: Report, of = pins) {
    return composer.compose({ report, pins: of, houseStyle: style, phrasebook: book }).elements;
  }

  it('gives unchanged elements as the same objects', () => {
    const composer = createComposer();
    const report = reportOf(blocks, pins);
    const before = compose(composer, report);
    const edited = report.blocks.map((block) =>
      block.id === 'p1' ? { ...block, content: prose('p1', [textNode('New')]).content } : block,
    );
    const after = compose(composer, { ...report, blocks: edited });
    expect(after.map((element, index) => element === before[index])).toEqual([true, false, true]);
  });

  it('remembers the framings, and composes prose for none of them', () => {
    const composer = createComposer();
    const report = reportOf(blocks, pins);
    const before = compose(composer, report);
    const absolute = compose(composer, { ...report, framing: 'absolute' });
    expect(absolute[0]).not.toBe(before[0]);
    const back = compose(composer, report);
    expect(back.every((element, index) => element === before[index])).toBe(true);
  });

  it('composes again only what shows the analysis whose pin moved', () => {
    const composer = createComposer();
    const report = reportOf(blocks, pins);
    const before = compose(composer, report);
    const moved: PinnedAnalysis = { ...WARD, resultId: 'newer' };
    const after = compose(composer, { ...report, pins: { ...report.pins, a2: 'newer' } }, [
      WET_WORK,
      moved,
    ]);
    expect(after.map((element, index) => element === before[index])).toEqual([true, true, false]);
  });

  it('takes a pin that was read again for the same', () => {
    const composer = createComposer();
    const report = reportOf(blocks, pins);
    const before = compose(composer, report);
    const again = compose(composer, report, structuredClone(pins));
    expect(again.every((element, index) => element === before[index])).toBe(true);
  });
});

function textNode(text: string): Record<string, unknown> {
  return { type: 'text', text };
}

function referenceTo(blockId: string): Record<string, unknown> {
  return { type: 'crossReference', attrs: { blockId } };
}

function prose(id: string, content: readonly Record<string, unknown>[]): Block {
  const document = { type: 'doc', content: [{ type: 'paragraph', content }] } as unknown;
  return blockOf(id, 'prose', null, { document: document as TextDocument });
}

function choosing(show: Readonly<Record<string, boolean>>): Block {
  const base = blockOf('t1', 'stratifiedTable', WET_WORK);
  const content = base.content as { readonly show: Readonly<Record<string, boolean>> };
  return { ...base, content: { ...content, show: { ...content.show, ...show } } };
}

function tableOf(block: Block, analysis: PinnedAnalysis): TableElement {
  return elementOf(composed(reportOf([block], [analysis]), [analysis]), 'table');
}

function cellsOf(table: TableElement, row: number): readonly string[] {
  return (table.rows[row]?.cells ?? []).map(({ runs }) => textOf(runs));
}

function captionsOf(elements: readonly LayoutElement[]): readonly string[] {
  return elements.flatMap((element) =>
    element.kind === 'table' || element.kind === 'figure'
      ? [`${element.blockId} ${element.caption.label} ${String(element.caption.number)}`]
      : [],
  );
}

function wordsOf(element: LayoutElement | undefined): string {
  if (element?.kind !== 'paragraph') throw new Error('not a paragraph');
  return textOf(element.runs);
}
