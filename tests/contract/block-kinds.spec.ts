import { describe, expect, it } from 'vitest';
import { addressKey, readValue } from '#shared/analysis';
import {
  BLOCK_KIND_LIST,
  BLOCK_KINDS,
  fieldValue,
  reportIssueText,
  runsOf,
  valueLedger,
  withFieldValue,
} from '#shared/report';
import type { BlockField, BlockKindId, PinnedAnalysis } from '#shared/report';
import { FRAMINGS } from '#shared/wording';
import { HOUSE_STYLE_IDS, houseStyle } from '../builders/house-styles';
import { blockOf, composed, pinned, reportOf } from '../builders/reports';
import { emptyStratumResult, wardResult, wetWorkResult } from '../builders/results';

const RESULTS = {
  wetWork: wetWorkResult(),
  ward: wardResult(),
  caseControl: wetWorkResult({ design: 'caseControl' }),
  emptyStratum: emptyStratumResult(),
};

describe.each(BLOCK_KIND_LIST.map((kind) => [kind.id, kind] as const))('kind %s', (id, kind) => {
  const kindId = id as BlockKindId;

  it('is registered under its own id', () => {
    expect(BLOCK_KINDS[kindId].id).toBe(id);
  });

  it.each(Object.entries(RESULTS))('goes create, parse, JSON, compose with %s', (_name, result) => {
    const analysis = pinned(result);
    const created = kind.emptyContent({ analysis });
    const parsed = kind.parseContent(created);
    expect(parsed).toEqual({ ok: true, value: created });
    const travelled = kind.parseContent(JSON.parse(JSON.stringify(created)));
    expect(travelled).toEqual(parsed);
    const report = reportOf([blockOf('b1', kindId, analysis)], [analysis]);
    const { elements } = composed(report, [analysis]);
    expect(elements.length).toBeGreaterThan(0);
    for (const element of elements) expect(element.blockId).toBe('b1');
    expect(elements.map(({ kind: drawn }) => drawn)).not.toContain('problem');
  });

  it('says that an analysis is missing rather than showing numbers', () => {
    const analysis = pinned(RESULTS.wetWork);
    const report = reportOf([blockOf('b1', kindId, analysis)], [analysis]);
    const printed = composed(report, []);
    const drawn = printed.elements.map((element) => element.kind);
    expect(drawn.includes('problem')).toBe(kind.needsAnalysis);
    expect(valueLedger(printed)).toEqual([]);
  });

  it('starts without an analysis too', () => {
    const content = kind.emptyContent({ analysis: null });
    expect(kind.parseContent(content)).toEqual({ ok: true, value: content });
    expect(kind.analysisIdsOf(content)).toEqual([]);
  });

  it('names the analyses that it shows', () => {
    const content = kind.emptyContent({ analysis: pinned(RESULTS.wetWork) });
    expect(kind.analysisIdsOf(content)).toEqual(kind.needsAnalysis ? ['a1'] : []);
  });

  it.each([
    ['nothing', null],
    ['a text', 'content'],
    ['an empty object', {}],
    ['another version', { ...emptyOf(kindId), schemaVersion: 2 }],
    ['wrong parts', corrupted(kindId)],
  ])('refuses %s in plain words', (_name, content) => {
    const parsed = kind.parseContent(content);
    expect(parsed.ok).toBe(false);
    if (!parsed.ok) expect(reportIssueText(parsed.issue)).toMatch(/^[A-Z].*[.]$/u);
  });

  it('drops what it does not know', () => {
    const content = emptyOf(kindId);
    expect(kind.parseContent({ ...content, surprise: 1 })).toEqual({ ok: true, value: content });
  });

  it('has a form whose every field leads into the content', () => {
    for (const field of kind.fields) {
      expect(fieldValue(emptyOf(kindId), field.path)).not.toBeUndefined();
      const changed = withFieldValue(emptyOf(kindId), field.path, sampleOf(field));
      expect(kind.parseContent(changed)).toMatchObject({ ok: true });
      expect(
        kind.parseContent(withFieldValue(emptyOf(kindId), field.path, Symbol('no'))),
      ).toMatchObject({ ok: false });
    }
  });

  it('prints only bound numbers that the result has, in every framing and house style', () => {
    for (const [name, result] of Object.entries(RESULTS)) {
      for (const framing of FRAMINGS) {
        for (const styleId of HOUSE_STYLE_IDS)
          expectBound(name, kindId, pinned(result), framing, styleId);
      }
    }
  });
});

function expectBound(
  name: string,
  kindId: BlockKindId,
  analysis: PinnedAnalysis,
  framing: (typeof FRAMINGS)[number],
  styleId: (typeof HOUSE_STYLE_IDS)[number],
): void {
  const report = reportOf([blockOf('b1', kindId, analysis)], [analysis], framing);
  const printed = composed(report, [analysis], houseStyle(styleId));
  for (const { address, text } of valueLedger(printed)) {
    const read = readValue(analysis.result, address);
    const where = `${name} ${framing} ${styleId} ${addressKey(address)} ${text}`;
    expect(`${where}: ${read.ok ? 'there' : read.issue.code}`).toBe(`${where}: there`);
    expect(`${where}: ${/\d|∞/u.test(text) ? 'figures' : 'none'}`).toBe(`${where}: figures`);
  }
  const typed = printed.elements.flatMap(runsOf).filter(({ origin }) => origin?.state === 'typed');
  expect(typed).toEqual([]);
}

function emptyOf(kindId: BlockKindId): Record<string, unknown> {
  const kind = BLOCK_KIND_LIST.find(({ id }) => id === kindId);
  return kind?.emptyContent({ analysis: pinned(RESULTS.wetWork) }) as Record<string, unknown>;
}

function corrupted(kindId: BlockKindId): unknown {
  const parts = Object.entries(emptyOf(kindId)).map(([key]) => [key, { wrong: true }]);
  return Object.fromEntries([...parts, ['schemaVersion', 1]]);
}

function sampleOf(field: BlockField): unknown {
  switch (field.kind) {
    case 'analysis':
      return 'a2';
    case 'scope':
      return { kind: 'stratum', stratumId: 'ward' };
    case 'indexLevel':
      return 'over6';
    case 'toggle':
      return true;
    case 'choice':
      return field.options[0]?.value;
    case 'text':
      return { type: 'doc', content: [{ type: 'paragraph' }] };
  }
}
