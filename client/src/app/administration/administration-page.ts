import { ChangeDetectionStrategy, Component, inject, type OnInit } from '@angular/core';
import type { Account } from '#shared/api';
import { Bar, BarActions } from '../ui/bar/bar';
import { Dialogs } from '../ui/dialog/dialogs';
import { Notices } from '../ui/notices/notices';
import { ProblemPanel } from '../ui/status/problem-panel';
import { AccountsTable } from './accounts-table';
import { AdministrationStore } from './administration-store';
import { MailOutbox } from './mail-outbox';

/** Accounts and outgoing mail, for administrators. Studies stay out of it. */
@Component({
  selector: 'eh-administration-page',
  imports: [AccountsTable, Bar, BarActions, MailOutbox, ProblemPanel],
  providers: [AdministrationStore],
  templateUrl: './administration-page.html',
  styleUrl: './administration-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AdministrationPage implements OnInit {
  private readonly dialogs = inject(Dialogs);
  private readonly notices = inject(Notices);
  protected readonly store = inject(AdministrationStore);

  ngOnInit(): void {
    this.store.load();
  }

  protected async invite(): Promise<void> {
    const { InvitationDialog } = await import('./invitation-dialog');
    this.dialogs.open<Account>(InvitationDialog).subscribe((account) => {
      this.notices.say(`${account.name} is invited.`);
      this.store.load();
    });
  }
}
