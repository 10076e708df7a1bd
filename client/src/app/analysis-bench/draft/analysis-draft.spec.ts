import type { CodeBook, CodeBookColumn } from '#shared/code-book';
import { expect, it } from 'vitest';
import {
  emptyDraft,
  isSameDraft,
  specificationOf,
  withEventLevelToggled,
  withExposure,
  withHomogeneity,
  withMethod,
  withOutcomeColumn,
  withOutcomeWords,
  withPooling,
  withReference,
  withRestriction,
  withStratumToggled,
} from './analysis-draft';
import { factorColumns } from './column-choices';

function column(id: string, codes: readonly string[], reference: string | null): CodeBookColumn {
  return {
    id,
    name: id,
    kind: 'category',
    label: id,
    sentenceLabel: id,
    unit: null,
    levels: codes.map((code) => ({
      id: code.toLowerCase(),
      codes: [code],
      label: code,
      sentenceLabel: code,
    })),
    bands: [],
    missingCodes: [],
    referenceLevelId: reference,
  };
}

const eczema = column('eczema', ['No', 'Yes'], null);
const wetWork = column('wet-work', ['None', 'Some', 'Much'], null);
const glove = column('glove', ['Worn', 'Bare'], 'worn');
const site = column('site', ['East', 'West'], null);
const codeBook: CodeBook = {
  schemaVersion: 1,
  layout: { kind: 'records' },
  columns: [eczema, wetWork, glove, site, { ...column('id', [], null), kind: 'identifier' }],
};

const contrast = withExposure(
  withOutcomeColumn(withOutcomeWords(emptyDraft(), 'o1'), eczema),
  wetWork,
);

it('is no specification before the contrast is picked', () => {
  expect(specificationOf(emptyDraft())).toBeNull();
  expect(specificationOf(withExposure(emptyDraft(), wetWork))).toBeNull();
});

it('guesses the event where a word says it, and the first level as reference', () => {
  expect(specificationOf(contrast)).toMatchObject({
    outcome: { outcomeId: 'o1', columnId: 'eczema', eventLevelIds: ['yes'] },
    exposure: { columnId: 'wet-work', referenceLevelId: 'none' },
    adjustment: 'crude',
  });
});

it('guesses the event as what is not the reference, and nothing among three levels', () => {
  expect(withOutcomeColumn(emptyDraft(), glove).outcome.eventLevelIds).toEqual(['bare']);
  expect(withOutcomeColumn(emptyDraft(), wetWork).outcome.eventLevelIds).toEqual([]);
});

it('keeps event levels in the order of the code book', () => {
  const much = withEventLevelToggled(withOutcomeColumn(emptyDraft(), wetWork), wetWork, 'much');
  const both = withEventLevelToggled(much, wetWork, 'some');
  expect(both.outcome.eventLevelIds).toEqual(['some', 'much']);
  expect(withEventLevelToggled(both, wetWork, 'much').outcome.eventLevelIds).toEqual(['some']);
});

it('pools as soon as there are strata, and stops when there are none', () => {
  const stratified = withStratumToggled(contrast, codeBook, 'site');
  expect(stratified.adjustment).toBe('mantelHaenszel');
  expect(withStratumToggled(stratified, codeBook, 'glove').stratumColumnIds).toEqual([
    'glove',
    'site',
  ]);
  expect(withStratumToggled(stratified, codeBook, 'site').adjustment).toBe('crude');
});

it('gives a column one role only', () => {
  const stratified = withStratumToggled(contrast, codeBook, 'glove');
  expect(withExposure(stratified, glove).stratumColumnIds).toEqual([]);
  const asOutcome = withOutcomeColumn(contrast, wetWork);
  expect(asOutcome.exposure).toEqual({ columnId: null, referenceLevelId: null });
});

it('makes the chosen level the reference of every contrast', () => {
  expect(withReference(contrast, 'much').exposure.referenceLevelId).toBe('much');
});

it('replaces and removes a restriction', () => {
  const east = withRestriction(contrast, 'site', ['east']);
  expect(east.restrictions).toEqual([{ columnId: 'site', levelIds: ['east'] }]);
  expect(withRestriction(east, 'site', ['west']).restrictions).toHaveLength(1);
  expect(withRestriction(east, 'site', null).restrictions).toEqual([]);
});

it('tells whether anything was changed', () => {
  expect(isSameDraft(contrast, withReference(contrast, 'none'))).toBe(true);
  expect(isSameDraft(contrast, withMethod(contrast, 'riskDifference', 'wald'))).toBe(false);
});

it('writes other methods down only where they are not the usual ones', () => {
  const pooled = withPooling(contrast, 'oddsRatio', 'exactConditional');
  const both = withHomogeneity(pooled, 'oddsRatio', 'woolf');
  expect(both.otherMethods).toEqual({
    poolings: { oddsRatio: 'exactConditional' },
    homogeneities: { oddsRatio: 'woolf' },
  });
  const back = withHomogeneity(
    withPooling(both, 'oddsRatio', 'robinsBreslowGreenland'),
    'oddsRatio',
    'breslowDayTarone',
  );
  expect(isSameDraft(back, contrast)).toBe(true);
  expect(back).not.toHaveProperty('otherMethods');
});

it('offers columns that have levels', () => {
  expect(factorColumns(codeBook).map(({ id }) => id)).toEqual([
    'eczema',
    'wet-work',
    'glove',
    'site',
  ]);
});
