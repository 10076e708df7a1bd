import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import type { Account } from '#shared/api';
import { filter } from 'rxjs';
import { SessionStore } from '../session/session-store';
import { dateAndTime, shortDate } from '../ui/dates';
import { Confirm } from '../ui/dialog/confirm';
import { ScrollSideways } from '../ui/scroll-sideways';
import { AdministrationStore } from './administration-store';

/** Everybody with an account: who administers, who may not sign in, who was here last. */
@Component({
  selector: 'eh-accounts-table',
  imports: [ScrollSideways],
  templateUrl: './accounts-table.html',
  styleUrl: './accounts-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AccountsTable {
  readonly accounts = input.required<readonly Account[]>();

  private readonly store = inject(AdministrationStore);
  private readonly confirm = inject(Confirm);
  private readonly session = inject(SessionStore);
  protected readonly shortDate = shortDate;
  protected readonly dateAndTime = dateAndTime;

  protected isMine(account: Account): boolean {
    return account.id === this.session.person()?.id;
  }

  protected disable(account: Account): void {
    this.confirm
      .ask({
        question: `Disable the account of ${account.name}?`,
        consequence:
          'They are signed out and cannot sign in. Their work stays, under their name. ' +
          'The account can be enabled again.',
        keep: 'Leave it enabled',
        act: 'Disable the account',
      })
      .pipe(filter((acted) => acted))
      .subscribe(() => {
        this.store.change(account, { disabled: true }, `${account.name} is disabled.`);
      });
  }

  protected enable(account: Account): void {
    this.store.change(account, { disabled: false }, `${account.name} is enabled.`);
  }

  protected setAdministrator(account: Account): void {
    const administrator = !account.administrator;
    const said = administrator ? 'is an administrator now.' : 'is no administrator any more.';
    this.store.change(account, { administrator }, `${account.name} ${said}`);
  }
}
