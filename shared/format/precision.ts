import type { AnalysisResult, LayerResult } from '#shared/analysis';
import type { EffectMeasureId } from '#shared/effects';
import type { HouseStyle } from '#shared/house-style';
import type { Estimate, GroupCount } from '#shared/stats';
import { differenceDecimals } from './difference-decimals';
import { percentDecimals } from './percent-decimals';
import { ratioDecimals } from './ratio-decimals';

/** What decides the decimals of an analysis: the groups and estimates that are printed together. */
export interface PrecisionBasis {
  readonly groups: readonly GroupCount[];
  readonly estimates: Readonly<Record<EffectMeasureId, readonly Estimate[]>>;
}

/** Decimals of each column; one setting for an analysis, so that text, table and figure agree. */
export interface PrintedDecimals extends Readonly<Record<EffectMeasureId, number>> {
  readonly percent: number;
}

/**
 * The decimals under which all numbers of one analysis are printed. Results and styles do not
 * change, so that each pair is worked out once.
 *
 * Shares follow the denominators of the style; differences follow the shares; ratios follow the
 * style. A column gets one more decimal where a limit would round onto the null value.
 */
export function decimalsOf(result: AnalysisResult, style: HouseStyle): PrintedDecimals {
  return decimalsUnder(precisionBasisOf(result), style);
}

/** As `decimalsOf`, from the basis that a claim carries. */
export function decimalsUnder(basis: PrecisionBasis, style: HouseStyle): PrintedDecimals {
  const byStyle = KNOWN_DECIMALS.get(basis) ?? new WeakMap<HouseStyle, PrintedDecimals>();
  KNOWN_DECIMALS.set(basis, byStyle);
  const known = byStyle.get(style) ?? workOutDecimals(basis, style);
  byStyle.set(style, known);
  return known;
}

/** The groups and estimates of a result: over all records, within strata and pooled. */
export function precisionBasisOf(result: AnalysisResult): PrecisionBasis {
  const known = KNOWN_BASES.get(result) ?? collectBasis(result);
  KNOWN_BASES.set(result, known);
  return known;
}

const KNOWN_BASES = new WeakMap<AnalysisResult, PrecisionBasis>();
const KNOWN_DECIMALS = new WeakMap<PrecisionBasis, WeakMap<HouseStyle, PrintedDecimals>>();

function workOutDecimals(basis: PrecisionBasis, style: HouseStyle): PrintedDecimals {
  const percent = percentDecimals(basis.groups, style.percent);
  const { riskDifference, riskRatio, oddsRatio } = basis.estimates;
  return {
    percent,
    riskDifference: differenceDecimals(riskDifference, percent, style),
    riskRatio: ratioDecimals(riskRatio, style),
    oddsRatio: ratioDecimals(oddsRatio, style),
  };
}

function collectBasis(result: AnalysisResult): PrecisionBasis {
  const layers = [result.crude, ...result.strata];
  const caseControl = result.frame.design === 'caseControl';
  return {
    groups: layers.flatMap(caseControl ? casesAndControls : exposureGroups),
    estimates: {
      riskDifference: estimatesOf(result, 'riskDifference'),
      riskRatio: estimatesOf(result, 'riskRatio'),
      oddsRatio: estimatesOf(result, 'oddsRatio'),
    },
  };
}

function exposureGroups(layer: LayerResult): readonly GroupCount[] {
  return layer.levels.map(({ count }) => count);
}

/** The exposed among the cases, then among the controls, level by level. */
function casesAndControls(layer: LayerResult): readonly GroupCount[] {
  const { events, total } = layer.total;
  return layer.levels.flatMap(({ count }) => [
    { events: count.events, total: events },
    { events: count.total - count.events, total: total - events },
  ]);
}

function estimatesOf(result: AnalysisResult, measure: EffectMeasureId): readonly Estimate[] {
  const contrasts = [
    ...result.crude.contrasts,
    ...result.strata.flatMap((layer) => layer.contrasts),
    ...result.pooled,
  ];
  return contrasts.flatMap(({ measures }) => {
    const estimate = measures[measure];
    return estimate.ok ? [estimate.value] : [];
  });
}
