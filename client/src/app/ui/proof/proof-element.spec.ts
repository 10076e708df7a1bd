import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { LayoutElement, Run, RunOrigin, TableElement, TableRow } from '#shared/layout';
import { beforeEach, describe, expect, it } from 'vitest';
import { ProofElement } from './proof-element';
import { PROOF_SOURCES } from './proof-sources';

const BOUND: RunOrigin = {
  blockId: 'b1',
  state: 'bound',
  addresses: [
    {
      analysisId: 'an-2',
      quantity: 'risk',
      levelId: 'over-6',
      scope: { kind: 'crude' },
      facet: 'value',
    },
  ],
};

const spotlight = signal<RunOrigin | null>(null);

beforeEach(() => {
  spotlight.set(null);
  TestBed.configureTestingModule({
    providers: [
      {
        provide: PROOF_SOURCES,
        useValue: { nameOf: () => 'A2', spotlight, isLit: () => false },
      },
    ],
  });
});

async function draw(element: LayoutElement): Promise<HTMLElement> {
  const fixture = TestBed.createComponent(ProofElement);
  fixture.componentRef.setInput('element', element);
  await fixture.whenStable();
  return fixture.nativeElement as HTMLElement;
}

function paragraph(...runs: Run[]): LayoutElement {
  return { kind: 'paragraph', blockId: 'b1', runs };
}

function cell(text: string): TableRow['cells'][number] {
  return { runs: [{ text }], numbers: [null] };
}

function row(kind: TableRow['kind'], ...texts: string[]): TableRow {
  return { kind, indent: kind === 'level' ? 1 : 0, cells: texts.map(cell) };
}

const head = (text: string, columnSpan: number, rowSpan: number) => ({
  runs: text === '' ? [] : [{ text }],
  columnSpan,
  rowSpan,
  align: 'end' as const,
});

const TABLE: TableElement = {
  kind: 'table',
  blockId: 'b2',
  caption: { label: 'Table', number: 2, runs: [{ text: 'Risk by wet work' }] },
  columns: [
    { id: 'level', align: 'start', width: 0.4, parts: [] },
    { id: 'events', align: 'end', width: 0.3, parts: [] },
    { id: 'risk', align: 'end', width: 0.3, parts: [] },
  ],
  head: [
    [head('Wet work', 1, 2), head('Hospital ward', 2, 1)],
    [head('n/N', 1, 1), head('Risk, %', 1, 1)],
  ],
  rows: [
    row('group', 'Hospital ward'),
    row('level', 'None', '11/236', '4.7'),
    row('group', 'Kitchen'),
    row('level', 'None', '4/118', '3.4'),
    row('test', 'Trend', 'p < 0.001'),
  ],
  notes: [[{ text: 'CI, confidence interval.' }]],
};

describe('words', () => {
  it('adds no space between runs', async () => {
    const drawn = await draw(
      paragraph({ text: 'in ' }, { text: '20.9', origin: BOUND }, { text: '%.' }),
    );
    expect(drawn.querySelector('p')!.textContent).toBe('in 20.9%.');
  });

  it('draws marks as styles, superscripts as elements', async () => {
    const drawn = await draw(
      paragraph({ text: 'a', marks: ['bold', 'italic'] }, { text: '2', marks: ['superscript'] }),
    );
    expect(drawn.querySelector('span.bold.italic')!.textContent).toBe('a');
    expect(drawn.querySelector('sup')!.textContent).toBe('2');
  });

  it('puts the three levels of heading below the title of the page', async () => {
    for (const level of [1, 2, 3] as const) {
      const drawn = await draw({
        kind: 'heading',
        level,
        blockId: 'b',
        runs: [{ text: 'Results' }],
      });
      expect(drawn.querySelector(`h${level + 1}`)!.textContent).toBe('Results');
    }
  });

  it('says in its place what cannot be printed', async () => {
    const drawn = await draw({ kind: 'problem', blockId: 'b', message: 'A2 is gone.' });
    expect(drawn.textContent).toContain('A2 is gone.');
  });
});

describe('values', () => {
  it('names the source of a bound value', async () => {
    const drawn = await draw(paragraph({ text: '20.9', origin: BOUND }));
    expect(drawn.querySelector('eh-value-chip')!.getAttribute('aria-label')).toBe(
      '20.9, bound to A2',
    );
  });

  it('lights the source while it has the focus', async () => {
    const drawn = await draw(paragraph({ text: '20.9', origin: BOUND }));
    const chip = drawn.querySelector<HTMLElement>('eh-value-chip')!;
    chip.dispatchEvent(new Event('focus'));
    expect(spotlight()).toBe(BOUND);
    chip.dispatchEvent(new Event('blur'));
    expect(spotlight()).toBeNull();
  });

  it('draws digits without a source as typed', async () => {
    const drawn = await draw(
      paragraph({ text: '22%', origin: { ...BOUND, state: 'typed', addresses: [] } }),
    );
    expect(drawn.querySelector('eh-value-chip.typed')!.getAttribute('aria-label')).toBe(
      '22%, typed, not bound',
    );
  });
});

describe('a table', () => {
  it('names its columns and spanners for readers', async () => {
    const drawn = await draw(TABLE);
    const scopes = [...drawn.querySelectorAll('thead th')].map((th) => th.getAttribute('scope'));
    expect(scopes).toEqual(['col', 'colgroup', 'col', 'col']);
  });

  it('makes one section a group and names rows and groups', async () => {
    const drawn = await draw(TABLE);
    const sections = [...drawn.querySelectorAll('tbody')];
    expect(sections.map((section) => section.rows.length)).toEqual([2, 3]);
    const group = sections[0]!.querySelector('th')!;
    expect([group.getAttribute('scope'), group.getAttribute('colspan')]).toEqual(['rowgroup', '3']);
  });

  it('lets the last cell of a short row span what is left', async () => {
    const drawn = await draw(TABLE);
    expect(drawn.querySelector('tr.test td')!.getAttribute('colspan')).toBe('2');
  });

  it('draws caption and notes', async () => {
    const drawn = await draw(TABLE);
    expect(drawn.querySelector('caption')!.textContent).toBe('Table 2. Risk by wet work');
    expect(drawn.querySelector('tfoot')!.textContent.trim()).toBe('CI, confidence interval.');
  });

  it('reads an empty head cell as no head', async () => {
    const drawn = await draw({ ...TABLE, head: [[head('', 1, 1), head('n/N', 1, 1)]] });
    expect(drawn.querySelectorAll('thead th')).toHaveLength(1);
  });
});
