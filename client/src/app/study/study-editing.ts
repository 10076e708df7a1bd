import { inject, Injectable } from '@angular/core';
import type { Member, Milestone, StudyView } from '#shared/api';
import type { OutcomeWords } from '#shared/analysis';
import type { StudyRole } from '#shared/permissions';
import { filter, type Observable, switchMap } from 'rxjs';
import { StudiesApi } from '../server-api/studies-api';
import { CurrentStudy } from '../session/current-study';
import { Confirm } from '../ui/dialog/confirm';
import type { Confirmation } from '../ui/dialog/confirm-dialog';
import { Dialogs } from '../ui/dialog/dialogs';
import { Notices } from '../ui/notices/notices';
import type { MilestoneToEdit } from './milestone-dialog';
import type { OutcomeToEdit } from './outcome-dialog';

/** What can be done to a study; every answer becomes the open study. */
@Injectable()
export class StudyEditing {
  private readonly api = inject(StudiesApi);
  private readonly current = inject(CurrentStudy);
  private readonly confirm = inject(Confirm);
  private readonly dialogs = inject(Dialogs);
  private readonly notices = inject(Notices);

  async changeDetails(study: StudyView): Promise<void> {
    const { StudyDetailsDialog } = await import('../ui/study-details/study-details-dialog');
    this.take(this.dialogs.open<StudyView>(StudyDetailsDialog, study), 'The study is saved.');
  }

  /** `outcome` null words a new one. */
  async wordOutcome(study: StudyView, outcome: OutcomeWords | null): Promise<void> {
    const { OutcomeDialog } = await import('./outcome-dialog');
    const data: OutcomeToEdit = { study, outcome };
    this.take(this.dialogs.open<StudyView>(OutcomeDialog, data), 'The outcome is saved.');
  }

  removeOutcome(study: StudyView, outcome: OutcomeWords): void {
    this.takeConfirmed(
      {
        question: `Remove the outcome “${outcome.noun}”?`,
        consequence: 'Its words go. An outcome that an analysis uses cannot be removed.',
        keep: 'Keep it',
        act: 'Remove the outcome',
      },
      () => this.api.removeOutcome(study.id, outcome.id),
      'The outcome is removed.',
    );
  }

  /** `milestone` null sets a new one. */
  async setMilestone(study: StudyView, milestone: Milestone | null): Promise<void> {
    const { MilestoneDialog } = await import('./milestone-dialog');
    const data: MilestoneToEdit = { studyId: study.id, milestone };
    this.take(this.dialogs.open<StudyView>(MilestoneDialog, data), 'The milestone is saved.');
  }

  removeMilestone(study: StudyView, milestone: Milestone): void {
    this.take(this.api.removeMilestone(study.id, milestone.id), 'The milestone is removed.');
  }

  async addMember(study: StudyView): Promise<void> {
    const { MemberDialog } = await import('./member-dialog');
    this.take(this.dialogs.open<StudyView>(MemberDialog, study), 'The member is added.');
  }

  changeRole(study: StudyView, member: Member, role: StudyRole): void {
    this.take(
      this.api.changeMember(study.id, member.personId, { role }),
      `The role of ${member.name} is changed.`,
    );
  }

  removeMember(study: StudyView, member: Member): void {
    this.takeConfirmed(
      {
        question: `Remove ${member.name} from the study?`,
        consequence: 'They no longer see it. What they wrote and changed stays, under their name.',
        keep: 'Keep them',
        act: 'Remove from the study',
      },
      () => this.api.removeMember(study.id, member.personId),
      `${member.name} is removed from the study.`,
    );
  }

  private takeConfirmed(
    confirmation: Confirmation,
    request: () => Observable<StudyView>,
    said: string,
  ): void {
    this.take(
      this.confirm.ask(confirmation).pipe(
        filter((acted) => acted),
        switchMap(request),
      ),
      said,
    );
  }

  private take(answer: Observable<StudyView>, said: string): void {
    answer.subscribe({
      next: (study) => {
        this.current.take(study);
        this.notices.say(said);
      },
      error: (failure: unknown) => {
        this.notices.refuse(failure);
      },
    });
  }
}
