import type { AnalysisView } from '#shared/api';
import type { AnalysisDraft } from '../draft/analysis-draft';
import type { NamedDraft } from './specification-differences';

/**
 * Somebody's newer analysis with one's own changes on top: a part that was changed here holds as it
 * is here, every other one as it is there. `base` is what both started from.
 */
export function onTopOf(theirs: AnalysisView, mine: NamedDraft, base: AnalysisView): NamedDraft {
  const methods = changedParts(
    theirs.specification.methods,
    mine.specification.methods,
    base.specification.methods,
  );
  const specification: AnalysisDraft = {
    ...changedParts<AnalysisDraft>(theirs.specification, mine.specification, base.specification),
    methods,
  };
  return { name: mine.name === base.name ? theirs.name : mine.name, specification };
}

/** A part that is left out here and was there before was taken away here. */
function changedParts<Whole extends object>(theirs: Whole, mine: Whole, base: Whole): Whole {
  const keys = [...new Set([...Object.keys(mine), ...Object.keys(base)])] as (keyof Whole)[];
  const changed = keys.filter((key) => JSON.stringify(mine[key]) !== JSON.stringify(base[key]));
  const merged = { ...theirs, ...Object.fromEntries(changed.map((key) => [key, mine[key]])) };
  const entries = Object.entries(merged).filter(([, value]) => value !== undefined);
  return Object.fromEntries(entries) as Whole;
}
