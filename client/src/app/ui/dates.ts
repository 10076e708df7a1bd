const LONG = new Intl.DateTimeFormat('en-GB', {
  weekday: 'long',
  day: 'numeric',
  month: 'long',
  year: 'numeric',
});
const SHORT = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
const TIME = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });
const WEEKDAY = new Intl.DateTimeFormat('en-GB', { weekday: 'short' });

/** "Monday 1 December 2025" */
export function longDate(date: Date): string {
  return LONG.format(date).replace(',', '');
}

/** "1 Dec 2025", for a day such as 2025-12-01 or a moment such as 2025-12-01T09:30:00Z. */
export function shortDate(text: string): string {
  return SHORT.format(text.length === 10 ? dayOf(text) : new Date(text));
}

/** "1 Dec 2025, 09:30", in the time zone of the reader. */
export function dateAndTime(moment: string): string {
  const date = new Date(moment);
  return `${SHORT.format(date)}, ${TIME.format(date)}`;
}

/** "09:30", in the time zone of the reader. */
export function timeOfDay(moment: string): string {
  return TIME.format(new Date(moment));
}

/** "Mon 1" */
export function weekdayAndDay(day: string): string {
  const date = dayOf(day);
  return `${WEEKDAY.format(date)} ${date.getDate()}`;
}

/** The calendar day of a moment where the reader is, as in 2025-12-01. */
export function isoDay(date: Date): string {
  const month = String(date.getMonth() + 1).padStart(2, '0');
  return `${date.getFullYear()}-${month}-${String(date.getDate()).padStart(2, '0')}`;
}

/** The day that lies `count` days after another (before it, when negative). */
export function dayAfter(day: string, count: number): string {
  const date = dayOf(day);
  date.setDate(date.getDate() + count);
  return isoDay(date);
}

/** Days from the Monday of its week: 0 for a Monday, 6 for a Sunday. */
export function daysSinceMonday(day: string): number {
  return (dayOf(day).getDay() + 6) % 7;
}

/** Noon, so that no change of the clocks moves it to another day. */
function dayOf(day: string): Date {
  return new Date(`${day}T12:00:00`);
}
