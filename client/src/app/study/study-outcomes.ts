import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import type { StudyView } from '#shared/api';
import { CurrentStudy } from '../session/current-study';
import { EmptyState } from '../ui/status/empty-state';
import { outcomeReads } from './outcome-reads';
import { StudyEditing } from './study-editing';

/** The outcomes of a study with the words that sentences, tables and figures use for them. */
@Component({
  selector: 'eh-study-outcomes',
  imports: [EmptyState],
  templateUrl: './study-outcomes.html',
  styleUrl: './study-outcomes.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StudyOutcomes {
  readonly study = input.required<StudyView>();

  protected readonly current = inject(CurrentStudy);
  protected readonly editing = inject(StudyEditing);
  protected readonly reads = outcomeReads;
}
