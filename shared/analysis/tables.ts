import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { GroupCount } from '#shared/stats';
import type { Tally, TallyAxis } from '#shared/tally';
import type { AnalysisIssue } from './analysis-issue';
import type { ResultFrame } from './analysis-result';
import type { AnalysisSpecification } from './specification';

/** Counts of one layer by exposure level id, every level of the frame present. */
export type LayerCounts = ReadonlyMap<string, GroupCount>;

/** The counts of an analysis: over all records and by stratum id, every stratum present. */
export interface AnalysisCounts {
  readonly crude: LayerCounts;
  readonly strata: ReadonlyMap<string, LayerCounts>;
}

interface MutableCount {
  events: number;
  total: number;
}

/**
 * Arranges a sparse tally (outcome, exposure, strata) as events and totals by level, crude and by
 * stratum. Levels and strata without records are there with zeros; axes that do not match the
 * specification and frame give `tallyDoesNotFit`.
 */
export function countsOf(
  specification: AnalysisSpecification,
  frame: ResultFrame,
  tally: Tally,
): Result<AnalysisCounts, AnalysisIssue> {
  const misfit = misfitOf(specification, tally);
  if (misfit) {
    return failure(misfit);
  }
  const crude = emptyLayer(frame);
  const strata = new Map(frame.strata.map(({ id }) => [id, emptyLayer(frame)]));
  for (const { at, count } of tally.cells) {
    const cell = readCell(at, tally.axes);
    const layers = [crude, ...(frame.strata.length > 0 ? [strata.get(cell.stratumId)] : [])];
    const places = layers.map((layer) => layer?.get(cell.exposureLevelId));
    const issue = issueOfCell(places, count, cell);
    if (issue) {
      return failure(issue);
    }
    const events = specification.outcome.eventLevelIds.includes(cell.outcomeLevelId) ? count : 0;
    for (const place of places as readonly MutableCount[]) {
      place.events += events;
      place.total += count;
    }
  }
  return success({ crude, strata });
}

function misfitOf(specification: AnalysisSpecification, tally: Tally): AnalysisIssue | null {
  const { outcome, exposure, stratumColumnIds } = specification;
  const expected = [outcome.columnId, exposure.columnId, ...stratumColumnIds];
  const place = expected.findIndex((id, axis) => tally.axes[axis]?.columnId !== id);
  const columnId = place >= 0 ? expected[place] : tally.axes[expected.length]?.columnId;
  return columnId === undefined ? null : { code: 'tallyDoesNotFit', facts: { columnId } };
}

function emptyLayer(frame: ResultFrame): Map<string, MutableCount> {
  return new Map(frame.exposure.levels.map(({ id }) => [id, { events: 0, total: 0 }]));
}

interface ReadCell {
  readonly outcomeLevelId: string;
  readonly exposureLevelId: string;
  readonly stratumId: string;
}

function readCell(at: readonly number[], axes: readonly TallyAxis[]): ReadCell {
  const ids = axes.map((axis, place) => axis.levelIds[at[place] ?? -1] ?? '');
  const [outcomeLevelId = '', exposureLevelId = '', ...stratum] = ids;
  return { outcomeLevelId, exposureLevelId, stratumId: stratum.join('|') };
}

function issueOfCell(
  places: readonly (MutableCount | undefined)[],
  count: number,
  cell: ReadCell,
): AnalysisIssue | null {
  if (!Number.isSafeInteger(count) || count < 0) {
    return { code: 'invalidCounts', facts: { count } };
  }
  const facts = { levelId: cell.exposureLevelId, stratumId: cell.stratumId };
  const misplaced = cell.outcomeLevelId === '' || places.includes(undefined);
  return misplaced ? { code: 'tallyDoesNotFit', facts } : null;
}
