import type { CodeBook, CodeBookColumn, CodeBookLevel, ColumnKind } from '#shared/code-book';
import type { StudyDesign } from '#shared/effects';
import type { Tally, TallyCell } from '#shared/tally';
import type { AnalysisResult, OutcomeWords } from '../analysis-result';
import { computeAnalysis } from '../compute-analysis';
import { defaultSpecification } from '../default-specification';
import { frameOf } from '../frame';
import type { FrameStudy } from '../frame';
import type { AnalysisSpecification } from '../specification';
import { tallyRequestOf } from '../tally-request';

/** Events and total of one group. */
export type Pair = readonly [events: number, total: number];

/** An analysis as a test states it: counts by stratum and level, and what is unusual. */
export interface CountsAnalysis {
  /** Exposure levels; ids and labels alike. The first is the reference. */
  readonly levels: readonly string[];
  /** One list of pairs for an unstratified analysis, or one by stratum name. */
  readonly counts: readonly Pair[] | Readonly<Record<string, readonly Pair[]>>;
  readonly exposureKind?: ColumnKind;
  readonly design?: StudyDesign;
  readonly specification?: Partial<AnalysisSpecification>;
}

/** The words that test analyses use. */
export const TEST_OUTCOME: OutcomeWords = {
  id: 'o1',
  noun: 'rash',
  verbPhrase: 'developed a rash',
  timeFrame: '4 weeks',
  desirability: 'harmful',
};

/** Everything that a computation takes, made of the counts of a test. */
export interface TestInputs {
  readonly codeBook: CodeBook;
  readonly specification: AnalysisSpecification;
  readonly study: FrameStudy;
  readonly tally: Tally;
}

/** Turns the counts of a test into a code book, a specification and a sparse tally. */
export function inputsOf(analysis: CountsAnalysis): TestInputs {
  const layers: Readonly<Record<string, readonly Pair[]>> = isPlain(analysis.counts)
    ? { '': analysis.counts }
    : analysis.counts;
  const strata = isPlain(analysis.counts) ? [] : Object.keys(layers);
  const columns = [
    testColumn('outcome', 'category', ['yes', 'no']),
    testColumn('exposure', analysis.exposureKind ?? 'category', analysis.levels),
    ...(strata.length > 0 ? [testColumn('stratum', 'category', strata)] : []),
  ];
  const specification = defaultSpecification({
    outcome: { outcomeId: 'o1', columnId: 'outcome', eventLevelIds: ['yes'] },
    exposure: { columnId: 'exposure', referenceLevelId: analysis.levels[0] ?? '' },
    stratumColumnIds: strata.length > 0 ? ['stratum'] : [],
    ...analysis.specification,
  });
  return {
    codeBook: { schemaVersion: 1, layout: { kind: 'records' }, columns },
    specification,
    study: { design: analysis.design ?? 'cohort', peopleNoun: 'workers', population: 'a plant' },
    tally: tallyOf(specification, columns, Object.values(layers)),
  };
}

/** Computes the analysis of a test; it has to succeed. */
export function resultOf(analysis: CountsAnalysis): AnalysisResult {
  const { codeBook, specification, study, tally } = inputsOf(analysis);
  const frame = frameOf(codeBook, specification, TEST_OUTCOME, study);
  if (!frame.ok) {
    throw new Error(`No frame: ${frame.issue.code}`);
  }
  const result = computeAnalysis(specification, frame.value, tally);
  if (!result.ok) {
    throw new Error(`No result: ${result.issue.code}`);
  }
  return result.value;
}

/** A column whose level ids, codes and labels are alike. */
export function testColumn(
  id: string,
  kind: ColumnKind,
  levels: readonly string[],
): CodeBookColumn {
  return {
    id,
    name: id,
    kind,
    label: `The ${id}`,
    sentenceLabel: id,
    unit: null,
    levels: levels.map(testLevel),
    bands: [],
    missingCodes: [],
    referenceLevelId: null,
  };
}

function testLevel(id: string): CodeBookLevel {
  return { id, codes: [id], label: id, sentenceLabel: id };
}

function isPlain(counts: CountsAnalysis['counts']): counts is readonly Pair[] {
  return Array.isArray(counts);
}

function tallyOf(
  specification: AnalysisSpecification,
  columns: readonly CodeBookColumn[],
  layers: readonly (readonly Pair[])[],
): Tally {
  const { columnIds } = tallyRequestOf(specification);
  const cells = layers.flatMap((pairs, stratum) =>
    pairs.flatMap(([events, total], exposure): TallyCell[] => {
      const place = columns.length > 2 ? [exposure, stratum] : [exposure];
      return [
        { at: [0, ...place], count: events },
        { at: [1, ...place], count: total - events },
      ];
    }),
  );
  return {
    axes: columnIds.map((columnId) => ({
      columnId,
      levelIds: columns.find(({ id }) => id === columnId)?.levels.map(({ id }) => id) ?? [],
    })),
    cells: cells.filter(({ count }) => count > 0),
    counted: cells.reduce((sum, { count }) => sum + count, 0),
    restricted: 0,
    leftOut: [],
  };
}
