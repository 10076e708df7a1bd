import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { CurrentStudy } from '../session/current-study';
import { Bar, BarActions, BarBeside } from '../ui/bar/bar';
import { DESIGN_WORDS, ROLE_WORDS } from '../ui/words';
import { StudyEditing } from './study-editing';
import { StudyMembers } from './study-members';
import { StudyMilestones } from './study-milestones';
import { StudyOutcomes } from './study-outcomes';

/** What a study is about, how its outcomes are worded, what is due and who works on it. */
@Component({
  selector: 'eh-study-page',
  imports: [Bar, BarActions, BarBeside, RouterLink, StudyMembers, StudyMilestones, StudyOutcomes],
  providers: [StudyEditing],
  templateUrl: './study-page.html',
  styleUrl: './study-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StudyPage {
  protected readonly current = inject(CurrentStudy);
  protected readonly editing = inject(StudyEditing);
  protected readonly designs = DESIGN_WORDS;
  protected readonly roles = ROLE_WORDS;
  protected readonly mayManage = computed(() => this.current.may('manageStudy'));
}
