import * as z from 'zod';
import {
  accountChangeRequestSchema,
  accountSchema,
  newAccountRequestSchema,
  outboxMailSchema,
} from '#shared/api';
import type { Account, AccountChangeRequest, NewAccountRequest, OutboxMail } from '#shared/api';
import type { Outcome } from '../../errors/server-issue';
import { changeAccount } from '../../services/administration/change-account';
import { createAccount } from '../../services/administration/create-account';
import { listAccounts } from '../../services/administration/list-accounts';
import { listMail } from '../../services/mail/list-mail';
import { administratorRoute, json } from '../define-route';
import type { ByPerson, Call, Route } from '../route';
import { presentAccount, presentMail } from './administration-presenter';

/** Accounts and the outbox. An administrator sees accounts, not the data of studies. */
export const administrationRoutes: readonly Route[] = [
  administratorRoute({
    method: 'get',
    path: '/api/administration/accounts',
    summary: 'Lists all accounts.',
    reply: json(z.array(accountSchema)),
    handle: showAccounts,
  }),
  administratorRoute({
    method: 'post',
    path: '/api/administration/accounts',
    summary: 'Makes an account and invites its person by mail.',
    body: newAccountRequestSchema,
    reply: json(accountSchema, 201),
    handle: addAccount,
  }),
  administratorRoute({
    method: 'patch',
    path: '/api/administration/accounts/:personId',
    summary: 'Renames an account, switches it off or on, or changes who is an administrator.',
    body: accountChangeRequestSchema,
    reply: json(accountSchema),
    handle: editAccount,
  }),
  administratorRoute({
    method: 'get',
    path: '/api/administration/mail',
    summary: 'Lists the newest mails, with live links hidden.',
    reply: json(z.array(outboxMailSchema)),
    handle: showMail,
  }),
];

async function showAccounts({ dependencies }: Call): Promise<Outcome<Account[]>> {
  const users = await listAccounts(dependencies);
  return { ok: true, value: users.map(presentAccount) };
}

async function addAccount({
  dependencies,
  person,
  body,
}: Call<unknown, NewAccountRequest> & ByPerson): Promise<Outcome<Account>> {
  const made = await createAccount(dependencies, person, body);
  return made.ok ? { ok: true, value: presentAccount(made.value) } : made;
}

async function editAccount({
  dependencies,
  person,
  params,
  body,
}: Call<{ personId: string }, AccountChangeRequest> & ByPerson): Promise<Outcome<Account>> {
  const changed = await changeAccount(dependencies, person, params.personId, body);
  return changed.ok ? { ok: true, value: presentAccount(changed.value) } : changed;
}

async function showMail({ dependencies }: Call): Promise<Outcome<OutboxMail[]>> {
  const mails = await listMail(dependencies);
  return { ok: true, value: mails.map(presentMail) };
}
