import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import type { Member, StudyView } from '#shared/api';
import { STUDY_ROLES, type StudyRole } from '#shared/permissions';
import { CurrentStudy } from '../session/current-study';
import { ROLE_WORDS } from '../ui/words';
import { StudyEditing } from './study-editing';

/** Who works on a study and in which role. */
@Component({
  selector: 'eh-study-members',
  templateUrl: './study-members.html',
  styleUrl: './study-members.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StudyMembers {
  readonly study = input.required<StudyView>();

  protected readonly current = inject(CurrentStudy);
  protected readonly editing = inject(StudyEditing);
  protected readonly roles = STUDY_ROLES;
  protected readonly roleWords = ROLE_WORDS;

  protected changeRole(member: Member, event: Event): void {
    const list = event.target as HTMLSelectElement;
    const role = list.value as StudyRole;
    // What the server refuses (the last lead) must not stay chosen.
    list.value = member.role;
    this.editing.changeRole(this.study(), member, role);
  }
}
