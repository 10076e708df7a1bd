/** What a number format makes of a number: a plain number, or a point in time. */
export type FormatMeaning = 'number' | 'date' | 'dateTime' | 'time';

/** Formats that every workbook has without saying so (ISO/IEC 29500-1, 18.8.30). */
const BUILT_IN_TIMES: ReadonlyMap<number, FormatMeaning> = new Map<number, FormatMeaning>([
  ...range(14, 17).map((id) => [id, 'date'] as const),
  ...range(18, 21).map((id) => [id, 'time'] as const),
  [22, 'dateTime'],
  ...range(27, 31).map((id) => [id, 'date'] as const),
  ...range(32, 35).map((id) => [id, 'time'] as const),
  [36, 'date'],
  ...range(45, 47).map((id) => [id, 'time'] as const),
  ...range(50, 58).map((id) => [id, 'date'] as const),
]);

function range(from: number, to: number): readonly number[] {
  return Array.from({ length: to - from + 1 }, (_, index) => from + index);
}

/** What the format with an id means; `code` is its text where the workbook defines it. */
export function formatMeaning(id: number, code: string | undefined): FormatMeaning {
  if (code === undefined) return BUILT_IN_TIMES.get(id) ?? 'number';
  const bare = code
    .replace(/"[^"]*"|\\.|_.|\*./g, '')
    .replace(/\[(?!(?:h+|m+|s+)\])[^\]]*\]/gi, '')
    .toLowerCase();
  const first = bare.split(';')[0] ?? '';
  if (first.includes('general')) return 'number';
  const days = /[dy]/.test(first) || (first.includes('m') && !/[hs]/.test(first));
  const hours = /[hs]/.test(first);
  if (days) return hours ? 'dateTime' : 'date';
  return hours ? 'time' : 'number';
}

const DAY_MILLISECONDS = 86_400_000;

/** Day 0 of the two calendars of workbooks; the first has a 29 February 1900 that never was. */
const DAY_ZERO_1900 = Date.UTC(1899, 11, 30);
const DAY_ZERO_1904 = Date.UTC(1904, 0, 1);
const FEIGNED_LEAP_DAY = 60;
const LAST_DAY = 2_958_466;

/**
 * A day number of a workbook as ISO 8601 text: "2026-03-31", "2026-03-31T14:05:00", "14:05:00".
 *
 * Null for numbers that are no day of the calendar.
 */
export function dayText(
  serial: number,
  meaning: Exclude<FormatMeaning, 'number'>,
  calendar: '1900' | '1904',
): string | null {
  if (!(serial >= 0) || serial >= LAST_DAY) return null;
  const milliseconds = Math.round(shifted(serial, calendar) * 86_400) * 1000;
  const zero = calendar === '1904' ? DAY_ZERO_1904 : DAY_ZERO_1900;
  const iso = new Date(zero + milliseconds).toISOString();
  const [day = '', time = ''] = iso.slice(0, 19).split('T');
  if (meaning === 'time' && serial < 1) return time;
  const atMidnight = milliseconds % DAY_MILLISECONDS === 0;
  return atMidnight && meaning !== 'dateTime' ? day : `${day}T${time}`;
}

function shifted(serial: number, calendar: '1900' | '1904'): number {
  return calendar === '1900' && serial < FEIGNED_LEAP_DAY ? serial + 1 : serial;
}
