import type { AnalysisResult } from '#shared/analysis';
import { designGivesRisk } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import { checkNumbers, readOutsideNumbers } from './check-numbers';
import { finding } from './finding';
import type { OutsideFinding } from './finding';
import { outsideNullValue } from './outside-estimate';
import type { OutsideEstimateEntry, OutsideMeasureId } from './outside-estimate';

/**
 * All that the checks find: the numbers against each other, then the estimate against the analysis
 * that it stands beside (its level and reference, the side of the crude effect, how many people).
 */
export function checkOutsideEstimate(
  entry: OutsideEstimateEntry,
  result: AnalysisResult,
): readonly OutsideFinding[] {
  return [
    ...checkNumbers(entry),
    ...findPlace(entry, result),
    ...findOtherSide(entry, result),
    ...findOtherNumber(entry, result),
  ];
}

/** Whether a finding keeps the estimate from being saved. */
export function isRefused(findings: readonly OutsideFinding[]): boolean {
  return findings.some(({ severity }) => severity === 'refusal');
}

function findPlace(
  { levelId, referenceLevelId, measure, level }: OutsideEstimateEntry,
  { frame, specification }: AnalysisResult,
): readonly OutsideFinding[] {
  const { levels, referenceLevelId: present } = frame.exposure;
  const label = levels.find(({ id }) => id === referenceLevelId)?.label ?? referenceLevelId;
  const gone = levelId !== null && !levels.some(({ id }) => id === levelId);
  const noRisk = !designGivesRisk(frame.design) && RISK_MEASURES.includes(measure);
  return [
    ...(gone || levelId === present ? [finding('levelGone')] : []),
    ...(referenceLevelId === present ? [] : [finding('referenceChanged', { reference: label })]),
    ...(noRisk ? [finding('notGivenByDesign')] : []),
    ...(level === specification.level
      ? []
      : [finding('otherLevel', { entered: level, analysis: specification.level })]),
  ];
}

const RISK_MEASURES: readonly OutsideMeasureId[] = ['riskDifference', 'riskRatio'];

function findOtherSide(
  entry: OutsideEstimateEntry,
  result: AnalysisResult,
): readonly OutsideFinding[] {
  const adjusted = readOutsideNumbers(entry)?.value.value;
  const crude = crudeBeside(entry, result);
  const nullValue = outsideNullValue(entry.measure);
  if (adjusted === undefined || crude === null) {
    return [];
  }
  const sides = (adjusted - nullValue) * (crude - nullValue);
  return sides < 0 ? [finding('otherSide', { crude, value: entry.value })] : [];
}

/**
 * The crude number that an estimate stands beside: of the same measure, or for rate and hazard
 * ratios the risk or odds ratio, which lie on the same side of 1. Differences in percentage points.
 */
export function crudeBeside(entry: OutsideEstimateEntry, result: AnalysisResult): number | null {
  const { levelId, measure, referenceLevelId } = entry;
  if (referenceLevelId !== result.frame.exposure.referenceLevelId) {
    return null;
  }
  const contrast = result.crude.contrasts.find(({ indexLevelId }) => indexLevelId === levelId);
  const crude = COUNTERPARTS[measure]
    .map((id) => contrast?.measures[id])
    .find((estimate) => estimate?.ok === true);
  if (crude?.ok !== true) {
    return null;
  }
  return measure === 'riskDifference' ? 100 * crude.value.value : crude.value.value;
}

const COUNTERPARTS: Readonly<Record<OutsideMeasureId, readonly EffectMeasureId[]>> = {
  riskDifference: ['riskDifference'],
  riskRatio: ['riskRatio'],
  oddsRatio: ['oddsRatio'],
  rateRatio: ['riskRatio', 'oddsRatio'],
  hazardRatio: ['riskRatio', 'oddsRatio'],
};

function findOtherNumber(
  { numberAnalysed }: OutsideEstimateEntry,
  { crude }: AnalysisResult,
): readonly OutsideFinding[] {
  const counted = crude.total.total;
  const other = numberAnalysed !== null && numberAnalysed !== counted;
  return other ? [finding('otherNumber', { entered: numberAnalysed, counted })] : [];
}
