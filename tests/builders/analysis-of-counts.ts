import { computeAnalysis, defaultSpecification } from '#shared/analysis';
import type { AnalysisResult, AnalysisSpecification, ResultFrame } from '#shared/analysis';
import type { FactorLevel } from '#shared/code-book';

/** Events and total of one exposure level. */
export type Counted = readonly [events: number, total: number];

/** A scenario: who, what, and the counts by stratum id and level id. */
export interface CountedScenario {
  readonly frame: Omit<ResultFrame, 'strata' | 'strataLabel'> &
    Partial<Pick<ResultFrame, 'strata' | 'strataLabel'>>;
  /** Counts by stratum id; an unstratified scenario has the one key "". */
  readonly counts: Readonly<Record<string, Readonly<Record<string, Counted>>>>;
  readonly specification?: Partial<AnalysisSpecification>;
}

/** A level whose three names are given, or one name for all. */
export function level(id: string, sentenceLabel = id, label = sentenceLabel): FactorLevel {
  return { id, label, sentenceLabel };
}

/** The result of a scenario; counts that cannot be computed are a mistake of the test. */
export function analysisOfCounts(scenario: CountedScenario): AnalysisResult {
  const frame: ResultFrame = { strata: [], strataLabel: null, ...scenario.frame };
  const isStratified = frame.strata.length > 0;
  const specification: AnalysisSpecification = {
    ...defaultSpecification({
      outcome: { outcomeId: frame.outcome.id, columnId: 'outcome', eventLevelIds: ['event'] },
      exposure: {
        columnId: frame.exposure.columnId,
        referenceLevelId: frame.exposure.referenceLevelId,
      },
      stratumColumnIds: isStratified ? ['stratum'] : [],
    }),
    standing: { planned: 'prespecified', importance: 'primary', analysisSet: 'all records' },
    ...scenario.specification,
  };
  const result = computeAnalysis(specification, frame, tallyOf(frame, scenario.counts));
  if (!result.ok) {
    throw new Error(`The scenario cannot be computed: ${JSON.stringify(result.issue)}`);
  }
  return result.value;
}

function tallyOf(
  frame: ResultFrame,
  counts: CountedScenario['counts'],
): Parameters<typeof computeAnalysis>[2] {
  const strata = frame.strata.length > 0 ? frame.strata.map(({ id }) => id) : [''];
  const levels = frame.exposure.levels.map(({ id }) => id);
  const cells = strata.flatMap((stratum, s) =>
    levels.flatMap((id, l) => {
      const [events, total] = counts[stratum]?.[id] ?? [0, 0];
      const place = frame.strata.length > 0 ? [s] : [];
      return [
        { at: [0, l, ...place], count: events },
        { at: [1, l, ...place], count: total - events },
      ];
    }),
  );
  const stratumAxis = frame.strata.length > 0 ? [{ columnId: 'stratum', levelIds: strata }] : [];
  return {
    axes: [
      { columnId: 'outcome', levelIds: ['event', 'none'] },
      { columnId: frame.exposure.columnId, levelIds: levels },
      ...stratumAxis,
    ],
    cells: cells.filter(({ count }) => count > 0),
    counted: cells.reduce((sum, { count }) => sum + count, 0),
    restricted: 0,
    leftOut: [],
  };
}
