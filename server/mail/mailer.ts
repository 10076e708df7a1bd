import { mkdir, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';
import type { Configuration } from '../config';

/** A mail to be sent; plain text. */
export interface OutgoingMail {
  readonly id: string;
  readonly to: string;
  readonly subject: string;
  readonly text: string;
}

/** What became of a mail. A failure says why; the mail is not lost, it lies in the outbox then. */
export type Delivery =
  | { readonly kind: 'smtp' }
  | { readonly kind: 'outbox' }
  | { readonly kind: 'failed'; readonly problem: string };

/** Sends mail. */
export interface Mailer {
  readonly send: (mail: OutgoingMail) => Promise<Delivery>;
}

const SMTP_WAIT_IN_MILLISECONDS = 15_000;

/** Mail goes to the configured SMTP server, or else to files in `outbox/` of the data directory. */
export function createMailer(config: Configuration): Mailer {
  return config.smtpUrl === null ? outboxMailer(config) : smtpMailer(config, config.smtpUrl);
}

function smtpMailer(config: Configuration, url: string): Mailer {
  const transport = createTransport({
    url,
    connectionTimeout: SMTP_WAIT_IN_MILLISECONDS,
    socketTimeout: SMTP_WAIT_IN_MILLISECONDS,
  });
  return {
    send: async (mail) => {
      try {
        await transport.sendMail(message(mail, config));
        return { kind: 'smtp' };
      } catch (problem) {
        await outboxMailer(config).send(mail);
        const reason = problem instanceof Error ? problem.message : 'unknown';
        return { kind: 'failed', problem: reason };
      }
    },
  };
}

function outboxMailer(config: Configuration): Mailer {
  const folder = join(config.dataDirectory, 'outbox');
  const transport = createTransport({ streamTransport: true, buffer: true, newline: 'unix' });
  return {
    send: async (mail) => {
      const { message: bytes } = await transport.sendMail(message(mail, config));
      await mkdir(folder, { recursive: true, mode: 0o700 });
      await writeFile(join(folder, `${mail.id}.eml`), bytes as Buffer, { mode: 0o600 });
      return { kind: 'outbox' };
    },
  };
}

function message(mail: OutgoingMail, { mailSender }: Configuration): Record<string, unknown> {
  return {
    from: mailSender,
    to: { name: '', address: mail.to },
    subject: mail.subject.replace(/[\r\n]+/g, ' '),
    text: mail.text,
    disableFileAccess: true,
    disableUrlAccess: true,
  };
}
