import { inject, Injectable, signal } from '@angular/core';
import type { Account, AccountChangeRequest, OutboxMail } from '#shared/api';
import { AdministrationApi } from '../server-api/administration-api';
import { ApiProblem } from '../server-api/api-problem';
import { Notices } from '../ui/notices/notices';

/** The accounts of this service and the mail that it sent. */
@Injectable()
export class AdministrationStore {
  private readonly api = inject(AdministrationApi);
  private readonly notices = inject(Notices);
  private readonly knownAccounts = signal<readonly Account[] | null>(null);
  private readonly knownMail = signal<readonly OutboxMail[] | null>(null);
  private readonly refused = signal<ApiProblem | null>(null);

  /** Null until they are here. */
  readonly accounts = this.knownAccounts.asReadonly();
  /** Null until it is here; the last sent first. */
  readonly mail = this.knownMail.asReadonly();
  readonly problem = this.refused.asReadonly();

  load(): void {
    this.refused.set(null);
    const error = (failure: unknown): void => {
      this.refused.set(ApiProblem.from(failure));
    };
    this.api.listAccounts().subscribe({
      next: (accounts) => {
        this.knownAccounts.set(accounts);
      },
      error,
    });
    this.api.listMail().subscribe({
      next: (mail) => {
        this.knownMail.set(lastFirst(mail));
      },
      error,
    });
  }

  change(account: Account, request: AccountChangeRequest, said: string): void {
    this.api.changeAccount(account.id, request).subscribe({
      next: () => {
        this.notices.say(said);
        this.load();
      },
      error: (failure: unknown) => {
        this.notices.refuse(failure);
      },
    });
  }
}

function lastFirst(mail: readonly OutboxMail[]): readonly OutboxMail[] {
  return mail.toSorted((one, other) => other.sentAt.localeCompare(one.sentAt));
}
