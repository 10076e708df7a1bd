import type { ResultScope } from '#shared/analysis';
import type { AnalysisSummary } from '#shared/api';
import type { PinnedAnalysis } from '#shared/report';

/** A choice of a field: its value, and a text that stands for it in a list. */
export interface FieldOption {
  readonly key: string;
  readonly label: string;
  readonly value: unknown;
}

/** The analyses of the study, with the one that is shown even before the list has come. */
export function analysisOptions(
  list: readonly AnalysisSummary[],
  shown: PinnedAnalysis | undefined,
): readonly FieldOption[] {
  const options = list.map(({ id, number, name }) => option(id, `${number}, ${name}`));
  const listed = shown === undefined || list.some(({ id }) => id === shown.analysisId);
  return listed
    ? options
    : [option(shown.analysisId, `${shown.number}, ${shown.name}`), ...options];
}

/** The levels that can be compared with the reference. */
export function levelOptions({ result }: PinnedAnalysis): readonly FieldOption[] {
  const { levels, referenceLevelId } = result.frame.exposure;
  return levels
    .filter(({ id }) => id !== referenceLevelId)
    .map(({ id, label }) => option(id, label));
}

/** Where a number of an analysis may come from. */
export function scopeOptions({ result }: PinnedAnalysis): readonly FieldOption[] {
  const { strata, peopleNoun } = result.frame;
  const crude = strata.length === 0 ? `All ${peopleNoun}` : `All ${peopleNoun}, crude`;
  return [
    scopeOption({ kind: 'crude' }, crude),
    ...strata.map(({ id, label }) => scopeOption({ kind: 'stratum', stratumId: id }, label)),
    ...(result.pooled.length === 0 ? [] : [scopeOption({ kind: 'pooled' }, 'Pooled over strata')]),
  ];
}

/** A text that stands for a value in a list. */
export function optionKey(value: unknown): string {
  return typeof value === 'string' ? value : JSON.stringify(value);
}

function option(value: string, label: string): FieldOption {
  return { key: value, label, value };
}

function scopeOption(value: ResultScope, label: string): FieldOption {
  return { key: optionKey(value), label, value };
}
