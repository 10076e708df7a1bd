import type { AnalysisSpecification } from '#shared/analysis';
import type { AnalysisView, CutView } from '#shared/api';
import { COUNTED_OUTCOME_COLUMN_ID, type CodeBook, countedOutcomeColumn } from '#shared/code-book';
import { expect, it } from 'vitest';
import { emptyDraft, withStratumToggled } from '../draft/analysis-draft';
import { parsedLevel, parsedScore } from '../panels/setting-values';
import { CODE_BOOK, SPECIFICATION, wetWorkResult } from '../testing/wet-work';
import { newestCut } from './cut-place';
import { onTopOf } from './on-top';
import { repeatedIdentifiers } from './repeated-identifiers';
import { sameScope, scopeLabel, scopesOf } from './result-scopes';
import { specificationDifferences } from './specification-differences';
import { withoutGone } from './without-gone';

it('orders layers as tabs: all, strata, pooled', () => {
  const result = wetWorkResult();
  expect(scopesOf(result).map((scope) => scopeLabel(result, scope))).toEqual([
    'All, crude',
    'Ward',
    'Kitchen',
    'Pooled',
  ]);
  expect(sameScope({ kind: 'crude' }, { kind: 'pooled' })).toBe(false);
});

it('names what two versions differ in, in words', () => {
  const mine = { name: 'A', specification: SPECIFICATION };
  const theirs = {
    name: 'A',
    specification: {
      ...SPECIFICATION,
      level: 0.9,
      exposure: { columnId: 'work', referenceLevelId: 'much' },
    },
  };
  expect(specificationDifferences(mine, theirs, CODE_BOOK)).toEqual([
    { what: 'Reference', mine: 'None', theirs: 'Much' },
    { what: 'Confidence level', mine: '95%', theirs: '90%' },
  ]);
});

it('puts own changes on top and keeps what only others changed', () => {
  const view = (name: string, specification: AnalysisSpecification) =>
    ({ name, specification }) as AnalysisView;
  const base = view('A', SPECIFICATION);
  const theirs = view('A', {
    ...SPECIFICATION,
    methods: { ...SPECIFICATION.methods, riskRatio: 'koopman' },
  });
  const mine = {
    name: 'B',
    specification: {
      ...SPECIFICATION,
      level: 0.9,
      methods: { ...SPECIFICATION.methods, riskDifference: 'wald' },
    },
  };
  const merged = onTopOf(theirs, mine, base);
  expect(merged.name).toBe('B');
  expect(merged.specification).toMatchObject({
    level: 0.9,
    methods: { riskDifference: 'wald', riskRatio: 'koopman' },
  });
});

it('keeps of a draft what another code book has', () => {
  const stratified = withStratumToggled(SPECIFICATION, CODE_BOOK, 'place');
  const columns = CODE_BOOK.columns.filter(({ id }) => id !== 'eczema');
  const kept = withoutGone(stratified, { ...CODE_BOOK, columns });
  expect(kept.outcome).toEqual({ outcomeId: 'o1', columnId: null, eventLevelIds: [] });
  expect(kept.exposure.columnId).toBe('work');
});

it('picks the outcome that two count columns stand for', () => {
  const layout = { kind: 'eventsAndTotal', eventsColumnId: 'n', totalColumnId: 'N' } as const;
  const codeBook: CodeBook = {
    ...CODE_BOOK,
    layout,
    columns: [...CODE_BOOK.columns, countedOutcomeColumn(layout)!],
  };
  expect(withoutGone(emptyDraft(), codeBook).outcome).toMatchObject({
    columnId: COUNTED_OUTCOME_COLUMN_ID,
    eventLevelIds: ['event'],
  });
});

it.each([
  ['95', 0.95],
  ['99.9 %', 0.999],
  ['97,5', 0.975],
])('reads the level %j', (text, level) => {
  expect(parsedLevel(text)).toEqual({ ok: true, value: level });
});

it.each(['', '50', '100', 'high'])('refuses the level %j', (text) => {
  expect(parsedLevel(text).ok).toBe(false);
});

it('reads scores with either minus and either mark', () => {
  expect(parsedScore('−1,5')).toEqual({ ok: true, value: -1.5 });
  expect(parsedScore('x').ok).toBe(false);
});

const identifierBook: CodeBook = {
  ...CODE_BOOK,
  columns: [{ ...CODE_BOOK.columns[0]!, id: 'person', kind: 'identifier', label: 'Person' }],
};
const cut = {
  profile: {
    columns: [
      {
        columnId: 'person',
        values: [
          { value: 'P1', count: 2 },
          { value: 'P2', count: 1 },
          { value: '', count: 9 },
        ],
      },
    ],
  },
} as unknown as CutView;

it('sees identifiers that repeat, and asks only files of records', () => {
  expect(repeatedIdentifiers(identifierBook, cut)).toEqual({
    columnId: 'person',
    columnLabel: 'Person',
    identifiers: 1,
    records: 2,
  });
  const counted: CodeBook = { ...identifierBook, layout: { kind: 'count', columnId: 'n' } };
  expect(repeatedIdentifiers(counted, cut)).toBeNull();
});

it('starts with the newest cut', () => {
  const cutAt = (id: string, createdAt: string) => ({
    id,
    number: 1,
    dataDate: '2026-01-01',
    fileName: '',
    rows: 1,
    sha256: '',
    createdAt,
    createdBy: '',
  });
  const dataSets = [
    { id: 'd1', name: '', codeBookNumber: 1, cuts: [cutAt('old', '2026-01-01T00:00:00Z')] },
    { id: 'd2', name: '', codeBookNumber: 1, cuts: [cutAt('new', '2026-02-01T00:00:00Z')] },
  ];
  expect(newestCut(dataSets)?.cut.id).toBe('new');
  expect(newestCut([])).toBeNull();
});
