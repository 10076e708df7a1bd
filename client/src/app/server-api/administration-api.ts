import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { Account, AccountChangeRequest, NewAccountRequest, OutboxMail } from '#shared/api';
import type { Observable } from 'rxjs';

/** Accounts and the mail outbox, for administrators. */
@Injectable({ providedIn: 'root' })
export class AdministrationApi {
  private readonly http = inject(HttpClient);

  listAccounts(): Observable<Account[]> {
    return this.http.get<Account[]>('/api/administration/accounts');
  }

  /** Creates the account and sends its invitation. */
  createAccount(request: NewAccountRequest): Observable<Account> {
    return this.http.post<Account>('/api/administration/accounts', request);
  }

  changeAccount(personId: string, request: AccountChangeRequest): Observable<Account> {
    const url = `/api/administration/accounts/${encodeURIComponent(personId)}`;
    return this.http.patch<Account>(url, request);
  }

  listMail(): Observable<OutboxMail[]> {
    return this.http.get<OutboxMail[]>('/api/administration/mail');
  }
}
