import type { AnalysisView, CodeBookView, CutView, NewAnalysisRequest } from '#shared/api';
import { defaultSpecification } from '#shared/analysis';
import { COUNTED_OUTCOME_COLUMN_ID } from '#shared/code-book';
import type { ReportDesk } from './report-desk';

/** Counts that were typed on a desk, and a request for the analysis that they are for. */
export interface TypedCounts {
  readonly cut: CutView;
  readonly codeBook: CodeBookView;
  readonly request: NewAnalysisRequest;
}

const OUTCOME = {
  id: 'eczema',
  noun: 'hand eczema',
  verbPhrase: 'developed hand eczema',
  timeFrame: '12 months',
  desirability: 'harmful',
} as const;

const ROWS = [
  ['None', 'Ward', 11, 236],
  ['Over 6 h', 'Ward', 34, 163],
  ['None', 'Kitchen', 4, 118],
  ['Over 6 h', 'Kitchen', 47, 219],
] as const;

/** Types invented counts of two levels in two workplaces into a study. */
export async function typeCounts({ browser, at }: ReportDesk): Promise<TypedCounts> {
  await browser.put(at(`/outcomes/${OUTCOME.id}`), OUTCOME);
  const typed = await browser.post(at('/typed-counts'), {
    dataSetName: 'Staff',
    dataDate: '2026-01-31',
    exposureLabel: 'Wet work',
    outcomeLabel: 'Hand eczema',
    stratumLabel: 'Workplace',
    layout: 'eventsAndTotal',
    rows: ROWS.map(([level, stratum, events, other]) => ({ level, stratum, events, other })),
  });
  if (typed.status !== 201) throw new Error(`The counts were refused: ${typed.text}`);
  const cut = typed.body as CutView;
  const read = await browser.get(at(`/data-sets/${cut.dataSetId}/code-book`));
  const codeBook = read.body as CodeBookView;
  return { cut, codeBook, request: requestFor(cut, codeBook) };
}

/** Stores the analysis of typed counts. */
export async function defineTypedAnalysis(
  { browser, at }: ReportDesk,
  { request }: TypedCounts,
): Promise<AnalysisView> {
  const response = await browser.post(at('/analyses'), request);
  if (response.status !== 201) throw new Error(`The analysis was refused: ${response.text}`);
  return response.body as AnalysisView;
}

/** The level of a column that stands for a code. */
export function levelOf({ content }: CodeBookView, columnName: string, code: string): string {
  const column = content.columns.find(({ name }) => name === columnName);
  const level = column?.levels.find(({ codes }) => codes.includes(code));
  if (level === undefined) throw new Error(`${columnName} has no level for ${code}.`);
  return level.id;
}

function requestFor(cut: CutView, codeBook: CodeBookView): NewAnalysisRequest {
  const idOf = (name: string): string =>
    codeBook.content.columns.find((column) => column.name === name)?.id ?? '';
  const specification = defaultSpecification({
    outcome: {
      outcomeId: OUTCOME.id,
      columnId: COUNTED_OUTCOME_COLUMN_ID,
      eventLevelIds: ['event'],
    },
    exposure: {
      columnId: idOf('Wet work'),
      referenceLevelId: levelOf(codeBook, 'Wet work', 'None'),
    },
    stratumColumnIds: [idOf('Workplace')],
  });
  return { name: 'Wet work', cutId: cut.id, specification };
}
