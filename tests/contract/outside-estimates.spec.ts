import { describe, expect, it } from 'vitest';
import { addressKey, parseAddress } from '#shared/analysis';
import type { TableElement } from '#shared/layout';
import type { OutsideEstimate } from '#shared/outside-estimates';
import { boundText, createComposer, pinValues, valueLedger, valueWords } from '#shared/report';
import type { Block, PinnedAnalysis } from '#shared/report';
import { outsideAddress } from '#shared/wording';
import { HOUSE_STYLE_IDS, houseStyle, phrasebook } from '../builders/house-styles';
import { blockOf, composed, elementOf, pinned, reportOf, textOf } from '../builders/reports';
import { wardResult, wetWorkResult } from '../builders/results';

const BOOK = phrasebook();

function estimate(pin: PinnedAnalysis, change: Partial<OutsideEstimate> = {}): OutsideEstimate {
  const { levels, referenceLevelId } = pin.result.frame.exposure;
  return {
    id: 'e1',
    studyId: 's1',
    analysisId: pin.analysisId,
    version: 1,
    levelId: levels.at(-1)?.id ?? null,
    referenceLevelId,
    measure: 'oddsRatio',
    value: '1.50',
    lower: '1.10',
    upper: '2.05',
    level: 0.95,
    pValue: '0.011',
    method: 'logistic regression',
    covariates: ['age', 'sex', 'atopy'],
    numberAnalysed: 1180,
    source: 'Statistics group',
    computedOn: '2026-05-12',
    note: null,
    ...change,
  };
}

function beside(
  pin: PinnedAnalysis,
  ...changes: readonly Partial<OutsideEstimate>[]
): PinnedAnalysis {
  const outside = changes.map((change, place) => estimate(pin, { id: `e${place}`, ...change }));
  return { ...pin, outside };
}

function tableOf(pin: PinnedAnalysis, show: object = {}, layout = 'auto'): Block {
  const block = blockOf('t', 'stratifiedTable', pin);
  const content = block.content as { show: object };
  return { ...block, content: { ...content, layout, show: { ...content.show, ...show } } };
}

function composedTable(pin: PinnedAnalysis, block = tableOf(pin, { outside: true })): TableElement {
  return elementOf(composed(reportOf([block], [pin]), [pin]), 'table');
}

const notesOf = ({ notes }: TableElement): readonly string[] =>
  notes.map((runs) => runs.map(({ text }) => text).join(''));

const headsOf = ({ head }: TableElement): readonly string[] =>
  head.flat().map(({ runs }) => runs.map(({ text }) => text).join(''));

const WARD = pinned(wardResult());
const WET_WORK = pinned(wetWorkResult());

describe('a table with estimates from elsewhere', () => {
  it.each([
    ['unstratified', WARD, 'auto'],
    ['strata below each other', WET_WORK, 'stacked'],
    ['strata side by side', WET_WORK, 'sideBySide'],
  ] as const)('has a column group of its own, %s', (_, pin, layout) => {
    const full = beside(pin, {}, { measure: 'hazardRatio', method: 'Cox regression' });
    const table = composedTable(full, tableOf(full, { outside: true }, layout));
    const plain = composedTable(full, tableOf(full, { outside: false }, layout));
    expect(table.columns).toHaveLength(plain.columns.length + 2);
    expect(table.columns.reduce((sum, { width }) => sum + width, 0)).toBeCloseTo(1, 12);
    expect(headsOf(table)).toEqual(
      expect.arrayContaining([
        'Adjusted, computed elsewhere',
        'Adjusted odds ratio (95%\u00a0CI)',
        'Adjusted hazard ratio (95%\u00a0CI)',
      ]),
    );
    expectHeadsToCover(table);
    for (const row of table.rows.filter(({ kind }) => kind === 'level')) {
      expect(row.cells).toHaveLength(table.columns.length);
    }
  });

  it('stands beside the crude rows only, once, with its own digits', () => {
    const full = beside(WET_WORK, {});
    const table = composedTable(full, tableOf(full, { outside: true, crude: false }, 'stacked'));
    const printed = table.rows.flatMap(({ cells }) => cells).filter((cell) => holds(cell, '1.50'));
    expect(printed).toHaveLength(1);
    expect(textOf(printed[0]!.runs)).toBe('1.50 (1.10 to 2.05)');
    const groups = table.rows.filter(({ kind }) => kind === 'group').map(({ cells }) => cells[0]);
    expect(groups.some((cell) => holds(cell!, 'All strata together, crude'))).toBe(true);
  });

  it('names method, covariates, number, source and day, and tells models apart', () => {
    const full = beside(WARD, {}, { value: '1.40', covariates: [], numberAnalysed: null });
    const notes = notesOf(composedTable(full));
    expect(notes).toContain(
      'Adjusted odds ratio, model 1: computed elsewhere, not from the counts shown here. Logistic regression, adjusted for age, sex and atopy; 1180 workers analysed. Source: Statistics group, 2026-05-12.',
    );
    expect(notes).toContain(
      'Adjusted odds ratio, model 2: computed elsewhere, not from the counts shown here. Logistic regression, without covariates. Source: Statistics group, 2026-05-12.',
    );
  });

  it('says in a note what is about all levels together', () => {
    const full = beside(WARD, { levelId: null });
    const table = composedTable(full);
    expect(headsOf(table)).not.toContain('Adjusted, computed elsewhere');
    expect(notesOf(table).join(' ')).toContain(
      'Over all levels, the odds ratio was 1.50 (95%\u00a0CI 1.10 to 2.05).',
    );
  });

  it('leaves out what compares something else, and prints nothing unless it is asked to', () => {
    const moved = beside(WARD, { referenceLevelId: 'other' }, { levelId: 'gone' });
    expect(headsOf(composedTable(moved))).not.toContain('Adjusted, computed elsewhere');
    const full = beside(WARD, {});
    const off = composedTable(full, tableOf(full, { outside: false }));
    expect(off).toEqual(composedTable(WARD, tableOf(WARD, { outside: false })));
    expect(off).toEqual(composedTable(WARD, tableOf(WARD, { outside: undefined })));
  });

  it.each(HOUSE_STYLE_IDS)('prints differences in the unit of %s', (id) => {
    const full = beside(WARD, {
      measure: 'riskDifference',
      value: '4.0',
      lower: '-1.2',
      upper: '9.2',
    });
    const style = houseStyle(id);
    const table = elementOf(
      createComposer().compose({
        report: reportOf([tableOf(full, { outside: true })], [full]),
        pins: [full],
        houseStyle: style,
        phrasebook: BOOK,
      }),
      'table',
    );
    const numbers = table.rows.flatMap(({ cells }) => cells).flatMap(({ numbers }) => numbers);
    const value = numbers.find((number) => number?.address.estimateId === 'e0');
    expect(value?.value).toBeCloseTo(0.04, 12);
    const digits = style.difference.unit === 'per1000' ? '40' : '4.0';
    expect(value?.text).toContain(digits.replace('.', style.numbers.decimalMark));
  });
});

describe('the ledger', () => {
  const full = beside(WARD, {});
  const sentence = blockOf('s', 'effectSentence', full);
  const said = { ...sentence, content: { ...(sentence.content as object), outside: true } };
  const report = reportOf([tableOf(full, { outside: true }), said], [full]);
  const ledger = valueLedger(composed(report, [full]));
  const own = ledger.filter(({ address }) => address.quantity === 'outsideEstimate');

  it('counts each printed number with its address', () => {
    const facets = own.map(({ blockId, address, text }) => `${blockId} ${address.facet} ${text}`);
    expect(facets).toEqual([
      't value 1.50',
      't lower 1.10',
      't upper 2.05',
      's value 1.50',
      's lower 1.10',
      's upper 2.05',
      expect.stringMatching(/^s pValue 0?\.01/),
    ]);
  });

  it('has addresses that can be written, read back, named and looked up', () => {
    const known = pinValues(full).map(({ address }) => addressKey(address));
    for (const { address } of own) {
      const key = addressKey(address);
      expect(parseAddress(key)).toEqual({ ok: true, value: address });
      expect(known).toContain(key);
      expect(valueWords(address, full, BOOK).what).toMatch(
        /^Adjusted odds ratio, computed elsewhere \(logistic regression\)/,
      );
    }
    expect(parseAddress('a/outsideEstimate/x/crude/value').ok).toBe(false);
  });
});

describe('a bound estimate from elsewhere', () => {
  const full = beside(WARD, {});
  const context = {
    pins: new Map([[full.analysisId, full]]),
    houseStyle: houseStyle('open-clinical'),
    phrasebook: BOOK,
  };
  const printed = (id: string, facet: 'value' | 'pValue', format: 'auto' | 'withLimits') => {
    const key = addressKey(outsideAddress(estimate(full, { id }), facet));
    const { state, parts } = boundText(key, format, context);
    return `${state}: ${parts.map(({ text }) => text).join('')}`;
  };

  it('prints in prose, alone and with its limits', () => {
    expect(printed('e0', 'value', 'auto')).toBe('bound: 1.50');
    expect(printed('e0', 'value', 'withLimits')).toBe('bound: 1.50 (95%\u00a0CI 1.10 to 2.05)');
    expect(printed('e0', 'pValue', 'auto')).toMatch(/^bound: 0?\.01/);
  });

  it('says so when it was removed', () => {
    expect(printed('e9', 'value', 'auto')).toBe(
      'missing: [value missing: the estimate from elsewhere is gone]',
    );
  });
});

it('a composer prints a changed estimate anew', () => {
  const composer = createComposer();
  const block = tableOf(WARD, { outside: true });
  const print = (pin: PinnedAnalysis) => {
    const request = { report: reportOf([block], [pin]), pins: [pin] };
    const style = { houseStyle: houseStyle('open-clinical'), phrasebook: BOOK };
    return JSON.stringify(composer.compose({ ...request, ...style }).elements);
  };
  expect(print(beside(WARD, {}))).toContain('1.50');
  expect(print(beside(WARD, { value: '1.49', version: 2 }))).toContain('1.49');
});

function holds({ runs }: { readonly runs: Parameters<typeof textOf>[0] }, text: string): boolean {
  return textOf(runs).includes(text);
}

/** Each place of the head is covered by one cell, no more and no less. */
function expectHeadsToCover({ head, columns }: TableElement): void {
  const covered = head.map(() => 0);
  head.forEach((cells, row) => {
    for (const { columnSpan, rowSpan } of cells) {
      for (let below = 0; below < rowSpan; below += 1) covered[row + below]! += columnSpan;
    }
  });
  expect(covered).toEqual(head.map(() => columns.length));
}
