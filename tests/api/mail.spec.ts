import { readdir, readFile, stat } from 'node:fs/promises';
import { join } from 'node:path';
import { afterEach, describe, expect, it } from 'vitest';
import { simpleText } from '../builders/mail-text';
import { startSmtpReceiver, type SmtpReceiver } from '../builders/smtp-receiver';
import { startTestApplication, type TestApplication } from '../builders/test-application';

let application: TestApplication;
let receiver: SmtpReceiver | null = null;

afterEach(async () => {
  await application.close();
  await receiver?.close();
  receiver = null;
});

async function requestReset(email: string): Promise<void> {
  const browser = await application.browser();
  await browser.post('/api/password-resets', { email });
  await application.dependencies.background.idle();
}

function outboxFiles(): Promise<string[]> {
  return readdir(join(application.dependencies.config.dataDirectory, 'outbox')).catch(() => []);
}

describe('mail through an SMTP server', () => {
  it('arrives with a link that works, and leaves nothing in the outbox on disk', async () => {
    receiver = await startSmtpReceiver();
    application = await startTestApplication({
      smtpUrl: receiver.url,
      mailSender: 'Evenhand <reports@example.org>',
      publicUrl: 'http://reports.example.org',
    });
    const person = await application.addPerson({ name: 'Ada Łuk' });
    await requestReset(person.email);
    expect(receiver.received).toHaveLength(1);
    const [mail] = receiver.received;
    expect(mail).toMatchObject({ from: 'reports@example.org', to: [person.email] });
    expect(mail!.source).toMatch(/^Subject: Set a new password for Evenhand$/m);
    const text = simpleText(mail!.source);
    expect(text).toContain('Hello Ada Łuk,');
    const link = /http:\/\/reports\.example\.org\/reset-password\?token=([\w-]+)/.exec(text);
    const browser = await application.browser();
    const completion = { token: link![1], newPassword: 'entirely new words' };
    const response = await browser.post('/api/password-resets/completion', completion);
    expect(response.status).toBe(204);
    await application.dependencies.background.idle();
    expect(await outboxFiles()).toEqual([]);
    const stored = await application.dependencies.database.stores.mail.newest(5);
    expect(stored.map(({ delivery }) => delivery)).toEqual(['smtp', 'smtp']);
    expect(application.bugs).toEqual([]);
  });

  it('that is refused is kept in the outbox and shown as failed', async () => {
    receiver = await startSmtpReceiver('refused');
    application = await startTestApplication({ smtpUrl: receiver.url });
    const person = await application.addPerson();
    await requestReset(person.email);
    expect(await outboxFiles()).toHaveLength(1);
    const [mail] = await application.dependencies.database.stores.mail.newest(5);
    expect(mail).toMatchObject({ toAddress: person.email, delivery: 'failed' });
    expect(mail!.problem).toContain('no such mailbox');
    expect(application.bugs[0]).toContain('The SMTP server did not take a mail');
  });

  it('that nobody answers is kept as well', async () => {
    const gone = await startSmtpReceiver();
    await gone.close();
    application = await startTestApplication({ smtpUrl: gone.url });
    const person = await application.addPerson();
    await requestReset(person.email);
    const [mail] = await application.dependencies.database.stores.mail.newest(5);
    expect(mail).toMatchObject({ delivery: 'failed' });
    expect(await outboxFiles()).toHaveLength(1);
  });
});

describe('mail without an SMTP server', () => {
  it('lies in the outbox on disk, for the owner of the files only', async () => {
    application = await startTestApplication();
    const person = await application.addPerson();
    await requestReset(person.email);
    const [name] = await outboxFiles();
    const path = join(application.dependencies.config.dataDirectory, 'outbox', name!);
    expect((await stat(path)).mode & 0o777).toBe(0o600);
    const mail = await readFile(path, 'utf8');
    expect(mail).toContain(`To: ${person.email}`);
    expect(simpleText(mail)).toMatch(/\/reset-password\?token=[\w-]{43}/);
    expect(application.bugs).toEqual([]);
  });

  it('takes names and titles as data: no header and no line can be added', async () => {
    application = await startTestApplication();
    const lead = await application.addPerson({ name: 'Eve\r\nBcc: all@example.org' });
    const study = await application.addStudy({ title: 'T\n\nhttp://elsewhere.example' });
    await application.addMember(study, lead, 'lead');
    const browser = await application.signedIn(lead);
    const request = { email: 'new@example.org', role: 'reader' };
    await browser.post(`/api/studies/${study.id}/members`, request);
    await application.dependencies.background.idle();
    const [name] = await outboxFiles();
    const path = join(application.dependencies.config.dataDirectory, 'outbox', name!);
    const mail = await readFile(path, 'utf8');
    expect(mail).not.toMatch(/^Bcc:/im);
    expect(simpleText(mail)).toContain('Eve Bcc: all@example.org added you to the study "T http');
  });
});
