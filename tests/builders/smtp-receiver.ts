import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';

/** A mail as an SMTP server received it. */
export interface ReceivedMail {
  readonly from: string;
  readonly to: readonly string[];
  readonly source: string;
}

/** A real SMTP server on this machine that keeps what it is given. */
export interface SmtpReceiver {
  readonly url: string;
  readonly received: readonly ReceivedMail[];
  readonly close: () => Promise<void>;
}

/** Listens on a free port of the loopback interface; may refuse every addressee. */
export async function startSmtpReceiver(
  addressees: 'accepted' | 'refused' = 'accepted',
): Promise<SmtpReceiver> {
  const received: ReceivedMail[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    logger: false,
    onRcptTo: (_address, _session, done) => {
      done(addressees === 'accepted' ? null : new Error('no such mailbox'));
    },
    onData: (stream, session, done) => {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const { mailFrom, rcptTo } = session.envelope;
        received.push({
          from: mailFrom === false ? '' : mailFrom.address,
          to: rcptTo.map(({ address }) => address),
          source: Buffer.concat(chunks).toString('utf8'),
        });
        done();
      });
    },
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.server.address() as AddressInfo;
  return {
    url: `smtp://127.0.0.1:${String(port)}`,
    received,
    close: () =>
      new Promise((resolve) => {
        server.close(() => {
          resolve();
        });
      }),
  };
}
