import { EFFECT_MEASURES, type EffectMeasureId } from '#shared/effects';
import type { Result } from '#shared/core';
import type { Estimate, EstimationIssue, FourfoldTable } from '#shared/stats';

/** One table for one method: what a method that takes its time is asked for. */
export interface MethodQuestion {
  readonly measure: EffectMeasureId;
  readonly methodId: string;
  readonly level: number;
  readonly table: FourfoldTable;
}

/** Equal questions have equal keys. */
export function questionKey({ measure, methodId, level, table }: MethodQuestion): string {
  const { index, reference } = table;
  const counts = [index.events, index.total, reference.events, reference.total];
  return [measure, methodId, level, ...counts].join(' ');
}

/** Computes what was asked for. */
export function answerTo({
  measure,
  methodId,
  level,
  table,
}: MethodQuestion): Result<Estimate, EstimationIssue> {
  return EFFECT_MEASURES[measure].estimate(table, methodId, level);
}
