import { csvText, type CsvRow } from './csv';
import { randomSource, shuffled } from './random';

const HEADER = [
  'guest',
  'sitting',
  'fish_pie',
  'mussels',
  'potato_salad',
  'berry_trifle',
  'ill_72h',
];

/** Invented guests by sitting and whether they ate the fish pie: [ill, all]. */
const GUESTS = [
  { sitting: 'early', fishPie: 'yes', ill: 19, all: 31 },
  { sitting: 'early', fishPie: 'no', ill: 3, all: 26 },
  { sitting: 'late', fishPie: 'yes', ill: 14, all: 24 },
  { sitting: 'late', fishPie: 'no', ill: 2, all: 33 },
] as const;

/** The guests of a harbour supper, a record a row. All invented. */
export function harbourSupperFiles(): Readonly<Record<string, string>> {
  const random = randomSource(20260620);
  const guests = GUESTS.flatMap((group) =>
    Array.from({ length: group.all }, (_, at) => ({ ...group, sick: at < group.ill })),
  );
  const rows = shuffled(guests, random).map((guest, at): CsvRow => {
    const tasted = (share: number): string => (random() < share ? 'yes' : 'no');
    const number = `G${String(at + 1).padStart(3, '0')}`;
    const dishes = [
      guest.fishPie,
      tasted(0.45),
      tasted(guest.fishPie === 'yes' ? 0.7 : 0.5),
      tasted(0.6),
    ];
    return [number, guest.sitting, ...dishes, guest.sick ? 'ill' : 'well'];
  });
  return { 'harbour-supper-guests.csv': csvText(HEADER, rows) };
}
