import { expect, it } from 'vitest';
import { outsideWeek, weekOf } from './week';

function milestone(id: string, dueDate: string) {
  return { id, title: id, dueDate, studyId: 's1', studyTitle: 'Wet work' };
}

it('shows Monday to Friday, with today and what is due', () => {
  const week = weekOf('2025-12-03', [milestone('sign-off', '2025-12-04')]);
  expect(week.map(({ day }) => day)).toEqual([
    '2025-12-01',
    '2025-12-02',
    '2025-12-03',
    '2025-12-04',
    '2025-12-05',
  ]);
  expect(week.filter(({ today }) => today).map(({ day }) => day)).toEqual(['2025-12-03']);
  expect(week[3]!.due.map(({ id }) => id)).toEqual(['sign-off']);
});

it('adds the weekend when something is due on it, or when it has come', () => {
  expect(weekOf('2025-12-03', [milestone('submission', '2025-12-07')])).toHaveLength(7);
  expect(weekOf('2025-12-06', [])).toHaveLength(7);
});

it('lists what was due and what comes later, the earliest first', () => {
  const { overdue, later } = outsideWeek('2025-12-03', [
    milestone('late', '2026-02-01'),
    milestone('next', '2025-12-08'),
    milestone('this week', '2025-12-05'),
    milestone('sunday', '2025-12-07'),
    milestone('missed', '2025-12-02'),
    milestone('missed long ago', '2025-11-02'),
  ]);
  expect(overdue.map(({ id }) => id)).toEqual(['missed long ago', 'missed']);
  expect(later.map(({ id }) => id)).toEqual(['next', 'late']);
});
