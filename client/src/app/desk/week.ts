import { dayAfter, daysSinceMonday } from '../ui/dates';

/** Something that is due on a day. */
export interface DueMilestone {
  readonly id: string;
  readonly title: string;
  readonly dueDate: string;
  readonly studyId: string;
  readonly studyTitle: string;
}

/** A day of the week in view with what is due on it. */
export interface WeekDay {
  readonly day: string;
  readonly today: boolean;
  readonly due: readonly DueMilestone[];
}

/**
 * The days of the week that `today` lies in, Monday to Friday; the weekend joins them when
 * something is due on it or it has come.
 */
export function weekOf(today: string, milestones: readonly DueMilestone[]): readonly WeekDay[] {
  const monday = dayAfter(today, -daysSinceMonday(today));
  const days = Array.from({ length: 7 }, (_, index) => dayAfter(monday, index)).map((day) => ({
    day,
    today: day === today,
    due: milestones.filter((milestone) => milestone.dueDate === day),
  }));
  const weekendCounts = days.slice(5).some((day) => day.today || day.due.length > 0);
  return weekendCounts ? days : days.slice(0, 5);
}

/** What was due before today, then what is due after this week: earliest first. */
export function outsideWeek(
  today: string,
  milestones: readonly DueMilestone[],
): { readonly overdue: readonly DueMilestone[]; readonly later: readonly DueMilestone[] } {
  const inOrder = milestones.toSorted((one, other) => one.dueDate.localeCompare(other.dueDate));
  const nextMonday = dayAfter(today, 7 - daysSinceMonday(today));
  return {
    overdue: inOrder.filter((milestone) => milestone.dueDate < today),
    later: inOrder.filter((milestone) => milestone.dueDate >= nextMonday),
  };
}
