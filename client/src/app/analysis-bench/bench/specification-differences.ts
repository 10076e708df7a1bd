import type { CodeBook } from '#shared/code-book';
import { EFFECT_MEASURE_IDS, EFFECT_MEASURES } from '#shared/effects';
import { type MethodWords, RISK_INTERVALS, TEST_METHODS } from '#shared/stats';
import type { AnalysisDraft } from '../draft/analysis-draft';
import { columnById, levelLabels } from '../draft/column-choices';

/** An analysis as two people have it. */
export interface NamedDraft {
  readonly name: string;
  readonly specification: AnalysisDraft;
}

/** One part in which two versions of an analysis differ, each in words. */
export interface SpecificationDifference {
  readonly what: string;
  readonly mine: string;
  readonly theirs: string;
}

/** The parts in which two versions of an analysis differ. */
export function specificationDifferences(
  mine: NamedDraft,
  theirs: NamedDraft,
  codeBook: CodeBook | null,
): readonly SpecificationDifference[] {
  const [own, other] = [describedParts(mine, codeBook), describedParts(theirs, codeBook)];
  return Object.keys(own).flatMap((what) => {
    const [one, two] = [own[what] ?? '', other[what] ?? ''];
    return one === two ? [] : [{ what, mine: one, theirs: two }];
  });
}

function describedParts(
  { name, specification }: NamedDraft,
  codeBook: CodeBook | null,
): Readonly<Record<string, string>> {
  const { outcome, exposure, stratumColumnIds, restrictions, level } = specification;
  const { methods, adjustment, trendScores, standing } = specification;
  const labelOf = (id: string | null): string => columnById(codeBook, id)?.label ?? id ?? 'none';
  const levelsOf = (columnId: string | null, ids: readonly string[]): string =>
    levelLabels(columnById(codeBook, columnId), ids).join(' or ');
  return {
    Name: name,
    Outcome: `${labelOf(outcome.columnId)}: ${levelsOf(outcome.columnId, outcome.eventLevelIds)}`,
    Exposure: labelOf(exposure.columnId),
    Reference: levelsOf(exposure.columnId, [exposure.referenceLevelId ?? '']),
    Strata: stratumColumnIds.map(labelOf).join(', ') || 'none',
    Records:
      restrictions
        .map(({ columnId, levelIds }) => `${labelOf(columnId)}: ${levelsOf(columnId, levelIds)}`)
        .join('; ') || 'all',
    'Confidence level': `${Number((level * 100).toPrecision(12))}%`,
    'Interval methods': methodLabels(methods).join(', '),
    'Over the strata': overStrata(specification).join(', ') || 'the usual methods',
    'Standard population':
      Object.values(specification.otherMethods?.standardShares ?? {}).join(', ') || 'none',
    Tests: testLabels(specification).join(', ') || 'the usual ones',
    Adjustment: adjustment === 'crude' ? 'none' : 'pooled over the strata',
    'Trend scores': trendScores === null ? '1, 2, 3 …' : Object.values(trendScores).join(', '),
    Standing: [
      standing.planned === 'postHoc' ? 'post hoc' : standing.planned,
      standing.importance,
      standing.analysisSet,
    ].join(', '),
  };
}

function testLabels({ otherMethods }: AnalysisDraft): readonly string[] {
  const tests: Readonly<Record<string, MethodWords>> = TEST_METHODS;
  const chosen = [otherMethods?.contrastTest, otherMethods?.trendTest];
  return chosen.flatMap((id) => (id === undefined ? [] : [tests[id]?.label ?? id]));
}

/** How each measure is pooled, and how the strata are compared on it. */
function overStrata({ otherMethods }: AnalysisDraft): readonly string[] {
  return EFFECT_MEASURE_IDS.flatMap((id) => {
    const { poolings, homogeneities } = EFFECT_MEASURES[id];
    const pooling = poolings[otherMethods?.poolings?.[id] ?? ''];
    const test = homogeneities[otherMethods?.homogeneities?.[id] ?? ''];
    return [pooling, test].flatMap((method) => (method === undefined ? [] : [method.label]));
  });
}

function methodLabels(methods: AnalysisDraft['methods']): readonly string[] {
  const risk: Readonly<Record<string, { readonly label: string }>> = RISK_INTERVALS;
  const measures = EFFECT_MEASURE_IDS.map(
    (id) => EFFECT_MEASURES[id].intervals[methods[id]]?.label ?? methods[id],
  );
  return [risk[methods.risk]?.label ?? methods.risk, ...measures];
}
