import type { ProblemElement } from '#shared/layout';
import type { PinnedAnalysis } from '#shared/report';
import { methodsNoteOf, phraseText } from '#shared/wording';
import { dayInWords, draftLines } from '../../draft-words';
import type { ExportRequest } from '../../export-request';
import { cellsRow, lookingLike, words, type SheetPlan, type SheetRow } from './sheet-plan';

/** What the report is, where its numbers come from, how they were made, and what to mind. */
export function notesSheet(request: ExportRequest): SheetPlan {
  const facts: readonly (readonly [string, string])[] = [
    ['Report', request.report.title],
    ...draftLines(request).map((line) => ['Caution', line] as const),
    ...problemsOf(request).map(({ message }) => ['Not printed', `[${message}]`] as const),
    ...request.pins.flatMap((pin) => analysisFacts(pin, request)),
    ['House style', `${request.houseStyle.name}, as of ${request.houseStyle.effectiveDate}`],
    ['Digits', DIGITS],
    ...request.report.abbreviations.map(
      ({ short, long }) => ['Abbreviation', `${short}, ${long}`] as const,
    ),
  ];
  return {
    name: 'Notes',
    rows: [
      cellsRow(lookingLike([words('Topic'), words('Note')], { bold: true, bottom: 'thin' })),
      ...facts.map(([topic, note]) => factRow(topic, note)),
    ],
    widestColumn: 480,
    headRows: { first: 1, last: 1 },
    frozenColumns: 0,
    filtered: false,
  };
}

const DIGITS =
  'Cells of tables hold numbers at full precision and show the digits that the report prints; ' +
  'percentages and percentage points count in hundredths. The sheet Values keeps shares as 0 to 1.';

function factRow(topic: string, note: string): SheetRow {
  return cellsRow([words(topic), words(note, { wraps: true })]);
}

function problemsOf({ report }: ExportRequest): readonly ProblemElement[] {
  return report.elements.filter((element) => element.kind === 'problem');
}

function analysisFacts(
  pin: PinnedAnalysis,
  { houseStyle, phrasebook }: ExportRequest,
): readonly (readonly [string, string])[] {
  const { cut, number, name, result, analysisId } = pin;
  const day = dayInWords(cut.dataDate, houseStyle.language);
  const engine = `engine ${result.engineVersion}`;
  const source = `${name}: data cut ${String(cut.number)}, data of ${day}, ${engine}.`;
  const methods = methodsNoteOf({ analysisId, result }, houseStyle, phrasebook).map(phraseText);
  return [
    [`Analysis ${number}`, source],
    ...methods.map((text) => [`Methods ${number}`, text] as const),
  ];
}
