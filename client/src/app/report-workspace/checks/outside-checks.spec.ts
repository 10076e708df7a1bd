import type { OutsideEstimate } from '#shared/outside-estimates';
import type { PinnedAnalysis, PrintedNumber } from '#shared/report';
import { outsideAddress } from '#shared/wording';
import { expect, it } from 'vitest';
import { wetWorkPrint } from '../../analysis-bench/testing/wet-work';
import { NOTHING_PRINTED, type PrintedBlock } from '../proof/printed-block';
import { outsideChecks } from './outside-checks';

const { result, style: houseStyle, book: phrasebook } = wetWorkPrint();

const ESTIMATE: OutsideEstimate = {
  id: 'e',
  studyId: 's',
  analysisId: 'a',
  version: 1,
  levelId: 'much',
  referenceLevelId: 'none',
  measure: 'oddsRatio',
  value: '2.50',
  lower: '1.20',
  upper: '5.21',
  level: 0.95,
  pValue: null,
  method: 'logistic regression',
  covariates: ['age'],
  numberAnalysed: 440,
  source: 'Statistics group',
  computedOn: null,
  note: null,
};

function pinWith(change: Partial<OutsideEstimate>): PinnedAnalysis {
  const cut = { id: 'c', number: 1, dataDate: '2026-01-31' };
  const outside = [{ ...ESTIMATE, ...change }];
  return { analysisId: 'a', number: 'A1', name: 'Eczema', resultId: 'r', cut, result, outside };
}

const PRINTED: PrintedBlock = { ...NOTHING_PRINTED, bound: [printedNumber()] };

function printedNumber(): PrintedNumber {
  return { blockId: 'b', address: outsideAddress(ESTIMATE, 'value'), text: '2.50' };
}

function said(printed: PrintedBlock, pin: PinnedAnalysis, seen = new Set<string>()): string[] {
  const checks = outsideChecks('b', printed, pin, { houseStyle, phrasebook, seen });
  return checks.map(({ weight, text, detail }) => `${weight}: ${text} | ${detail ?? ''}`);
}

it('says nothing of an estimate whose numbers agree', () => {
  expect(said(PRINTED, pinWith({}))).toEqual([]);
});

it('says what the checks find beside the block that prints the estimate', () => {
  const pin = pinWith({ upper: '6.21', numberAnalysed: 430 });
  expect(said(PRINTED, pin)).toEqual([
    expect.stringMatching(/^caution: The estimate does not stand in the middle of its limits/),
    expect.stringMatching(/^quiet: A1: Adjusted odds ratio, computed elsewhere \| The model/),
  ]);
  expect(said(NOTHING_PRINTED, pin)).toEqual([]);
});

it('says once that an estimate is not shown, as the reference is another now', () => {
  const pin = pinWith({ referenceLevelId: 'some' });
  const seen = new Set<string>();
  expect(said(NOTHING_PRINTED, pin, seen)).toEqual([
    expect.stringMatching(/^caution: It compares with Some, .* No report shows it/),
  ]);
  expect(said(NOTHING_PRINTED, pin, seen)).toEqual([]);
});
