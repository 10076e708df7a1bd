import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { shortDate, weekdayAndDay } from '../ui/dates';
import { type DueMilestone, outsideWeek, weekOf } from './week';

/** The week as a rule: today marked, what is due under its day; the rest below. */
@Component({
  selector: 'eh-desk-week',
  imports: [RouterLink],
  templateUrl: './desk-week.html',
  styleUrl: './desk-week.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DeskWeek {
  readonly today = input.required<string>();
  readonly milestones = input.required<readonly DueMilestone[]>();

  protected readonly days = computed(() => weekOf(this.today(), this.milestones()));
  protected readonly outside = computed(() => outsideWeek(this.today(), this.milestones()));
  protected readonly weekdayAndDay = weekdayAndDay;
  protected readonly shortDate = shortDate;
}
