import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { StudyView } from '#shared/api';
import { CurrentStudy } from '../session/current-study';
import { NOW } from '../ui/clock';
import { isoDay, shortDate } from '../ui/dates';
import { StudyEditing } from './study-editing';

/** What is due on a study, the earliest first. */
@Component({
  selector: 'eh-study-milestones',
  templateUrl: './study-milestones.html',
  styleUrl: './study-milestones.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StudyMilestones {
  readonly study = input.required<StudyView>();

  private readonly today = isoDay(inject(NOW)());
  protected readonly current = inject(CurrentStudy);
  protected readonly editing = inject(StudyEditing);
  protected readonly shortDate = shortDate;
  protected readonly milestones = computed(() =>
    this.study().milestones.toSorted((one, other) => one.dueDate.localeCompare(other.dueDate)),
  );

  protected isPast(dueDate: string): boolean {
    return dueDate < this.today;
  }
}
