import type { AnalysisResult } from '#shared/analysis';
import { decimalsOf } from '#shared/format';
import type { PrintedDecimals } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';

const known = new WeakMap<AnalysisResult, WeakMap<HouseStyle, PrintedDecimals>>();

/** The decimals of an analysis under a house style; worked out once for both objects. */
export function printedDecimals(result: AnalysisResult, style: HouseStyle): PrintedDecimals {
  const byStyle = known.get(result) ?? new WeakMap<HouseStyle, PrintedDecimals>();
  known.set(result, byStyle);
  const decimals = byStyle.get(style) ?? decimalsOf(result, style);
  byStyle.set(style, decimals);
  return decimals;
}
