import { describe, expect, it } from 'vitest';
import { checkNumbers } from '#shared/outside-estimates';
import { WET_WORK_ADJUSTED } from '../../seeds/studies/wet-work-adjusted';
import displayed from './displayed-strings.json';

type Digits = readonly [value: string, lower: string, upper: string, pValue: string];

interface Model {
  readonly level: string;
  readonly printed: Digits;
  /** The same numbers with more digits. */
  readonly fine: Digits;
}

/** Estimates of a logistic model with Wald limits, and their p-values, as R prints them. */
const models = displayed.cases.filter(({ kind }) => kind === 'model') as unknown as readonly Model[];

describe("an R model's estimates with limits and p-values that belong together", () => {
  it.each(models)('$level raise no finding as printed', ({ printed }) => {
    const [value, lower, upper, pValue] = printed;
    const entry = { measure: 'oddsRatio', value, lower, upper, level: 0.95 } as const;
    expect(checkNumbers({ ...entry, pValue })).toEqual([]);
  });

  it.each(models)('$level disagree with half and twice the p-value', ({ fine }) => {
    const [value, lower, upper, pValue] = fine;
    const entry = { measure: 'oddsRatio', value, lower, upper, level: 0.95 } as const;
    expect(checkNumbers({ ...entry, pValue })).toEqual([]);
    for (const factor of [0.5, 2]) {
      const other = (Number(pValue) * factor).toFixed(10);
      expect(checkNumbers({ ...entry, pValue: other }).map(({ id }) => id)).toEqual(['pDisagrees']);
    }
  });

  it.each(models)('$level: the seeds enter what R prints', ({ level, printed }) => {
    const entry = WET_WORK_ADJUSTED.find(({ levelId }) => levelId === level)!;
    expect([entry.value, entry.lower, entry.upper, entry.pValue]).toEqual(printed);
  });
});
