import {
  type AnalysisResult,
  type AnalysisSpecification,
  computeAnalysis,
  defaultSpecification,
  frameOf,
  type OutcomeWords,
} from '#shared/analysis';
import type { CodeBook, CodeBookColumn } from '#shared/code-book';
import type { StudyDesign } from '#shared/effects';
import { type HouseStyle, parseHouseStyle } from '#shared/house-style';
import type { Tally } from '#shared/tally';
import { parsePhrasebook, type Phrasebook } from '#shared/wording';
import openClinical from '../../../../../templates/house-styles/open-clinical/house-style.json';
import english from '../../../../../templates/phrasebooks/en.json';
import { type BenchPrint, benchPrint } from '../print/bench-print';

function column(
  id: string,
  kind: CodeBookColumn['kind'],
  labels: readonly string[],
): CodeBookColumn {
  return {
    id,
    name: id,
    kind,
    label: id.charAt(0).toUpperCase() + id.slice(1),
    sentenceLabel: id,
    unit: null,
    levels: labels.map((label) => ({
      id: label.toLowerCase(),
      codes: [label],
      label,
      sentenceLabel: label.toLowerCase(),
    })),
    bands: [],
    missingCodes: [],
    referenceLevelId: null,
  };
}

/** Three levels of an exposure, an outcome, and two strata; invented. */
export const CODE_BOOK: CodeBook = {
  schemaVersion: 1,
  layout: { kind: 'records' },
  columns: [
    column('eczema', 'category', ['No', 'Yes']),
    column('work', 'orderedCategory', ['None', 'Some', 'Much']),
    column('place', 'category', ['Ward', 'Kitchen']),
  ],
};

/** Words of the outcome. */
export const OUTCOME: OutcomeWords = {
  id: 'o1',
  noun: 'hand eczema',
  verbPhrase: 'developed hand eczema',
  timeFrame: '12 months',
  desirability: 'harmful',
};

/** Eczema by work within place, against none. */
export const SPECIFICATION: AnalysisSpecification = defaultSpecification({
  outcome: { outcomeId: 'o1', columnId: 'eczema', eventLevelIds: ['yes'] },
  exposure: { columnId: 'work', referenceLevelId: 'none' },
  stratumColumnIds: ['place'],
});

/** Counts by outcome, work and place: no, yes for each level, ward then kitchen. */
const COUNTS = [
  [
    [90, 10],
    [80, 20],
    [70, 30],
  ],
  [
    [45, 5],
    [40, 10],
    [38, 2],
  ],
] as const;

/** The counts as the server would give them. */
export const TALLY: Tally = {
  axes: [
    { columnId: 'eczema', levelIds: ['no', 'yes'] },
    { columnId: 'work', levelIds: ['none', 'some', 'much'] },
    { columnId: 'place', levelIds: ['ward', 'kitchen'] },
  ],
  cells: COUNTS.flatMap((levels, place) =>
    levels.flatMap((counts, work) =>
      counts.map((count, outcome) => ({ at: [outcome, work, place], count })),
    ),
  ),
  counted: COUNTS.flat(2).reduce((sum, count) => sum + count, 0),
  restricted: 0,
  leftOut: [{ columnId: 'work', reason: 'Not answered', count: 7 }],
};

/** The result under a design. */
export function wetWorkResult(
  design: StudyDesign = 'cohort',
  specification: AnalysisSpecification = SPECIFICATION,
): AnalysisResult {
  const study = { design, peopleNoun: 'workers', population: '' };
  const frame = frameOf(CODE_BOOK, specification, OUTCOME, study);
  const result = frame.ok ? computeAnalysis(specification, frame.value, TALLY) : frame;
  if (!result.ok) throw new Error(JSON.stringify(result.issue));
  return result.value;
}

/** The result with the house style and phrasebook that the program ships. */
export function wetWorkPrint(design: StudyDesign = 'cohort'): BenchPrint {
  return benchPrint(wetWorkResult(design), houseStyle(), phrasebook());
}

/** The phrasebook that the program ships. */
export function phrasebook(): Phrasebook {
  const book = parsePhrasebook(english);
  if (!book.ok) throw new Error(JSON.stringify(book.issue));
  return book.value;
}

function houseStyle(): HouseStyle {
  const style = parseHouseStyle(openClinical);
  if (!style.ok) throw new Error(JSON.stringify(style.issue));
  return style.value;
}
