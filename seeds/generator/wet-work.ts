import { csvText, type CsvRow } from './csv';
import { randomSource, shuffled } from './random';

/** Invented counts [with eczema, all] by hours of wet work per shift, codes 0 to 4. */
const FIRST_CUT = {
  ward: [
    [9, 221],
    [24, 381],
    [37, 396],
    [40, 287],
    [29, 150],
  ],
  kitchen: [
    [5, 112],
    [9, 160],
    [22, 229],
    [38, 251],
    [41, 204],
  ],
} as const;

const SECOND_CUT = {
  ward: [
    [11, 236],
    [27, 402],
    [43, 418],
    [46, 305],
    [34, 163],
  ],
  kitchen: [
    [4, 118],
    [9, 171],
    [26, 244],
    [43, 266],
    [47, 219],
  ],
} as const;

type CutCounts = Readonly<Record<'ward' | 'kitchen', readonly (readonly [number, number])[]>>;

interface Worker {
  readonly workplace: string;
  readonly wetWork: string;
  readonly eczema: string;
}

const HEADER = ['person_id', 'workplace', 'wet_work', 'eczema_12m', 'age_years', 'glove_hours'];

/** The two cuts of the cohort of hospital and kitchen staff, a record a row. All invented. */
export function wetWorkFiles(): Readonly<Record<string, string>> {
  return {
    'wet-work-first-cut.csv': wetWorkFile(FIRST_CUT, 29, 9, 20260314),
    'wet-work-second-cut.csv': wetWorkFile(SECOND_CUT, 31, 7, 20260914),
  };
}

function wetWorkFile(counts: CutCounts, unanswered: number, lost: number, seed: number): string {
  const random = randomSource(seed);
  const workers = [...analysed(counts), ...incomplete(unanswered, lost, random)];
  const rows = shuffled(workers, random).map((worker, at) => recordOf(worker, at, random));
  return csvText(HEADER, rows);
}

function analysed(counts: CutCounts): Worker[] {
  return Object.entries(counts).flatMap(([workplace, levels]) =>
    levels.flatMap(([events, total], level) =>
      Array.from({ length: total }, (_, at) => ({
        workplace,
        wetWork: String(level),
        eczema: at < events ? '1' : '0',
      })),
    ),
  );
}

function incomplete(unanswered: number, lost: number, random: () => number): Worker[] {
  const place = (): string => (random() < 0.6 ? 'ward' : 'kitchen');
  const noAnswer = Array.from({ length: unanswered }, (_, at) => ({
    workplace: place(),
    wetWork: at % 4 === 0 ? '' : '9',
    eczema: random() < 0.1 ? '1' : '0',
  }));
  const noOutcome = Array.from({ length: lost }, () => ({
    workplace: place(),
    wetWork: String(Math.floor(random() * 5)),
    eczema: '',
  }));
  return [...noAnswer, ...noOutcome];
}

function recordOf(worker: Worker, at: number, random: () => number): CsvRow {
  const age = 19 + Math.floor((random() + random()) * 22.5);
  const gloves = (random() * (1 + Number(worker.wetWork || 2))).toFixed(1);
  return [
    `P${String(at + 1).padStart(4, '0')}`,
    worker.workplace,
    worker.wetWork,
    worker.eczema,
    age,
    gloves,
  ];
}
