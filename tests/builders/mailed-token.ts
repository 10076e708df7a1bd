import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { simpleText } from './mail-text';
import type { TestApplication } from './test-application';

/** The token in the newest mail to this address, read from the outbox on disk. */
export async function mailedToken(application: TestApplication, address: string): Promise<string> {
  const { background, config } = application.dependencies;
  await background.idle();
  const folder = join(config.dataDirectory, 'outbox');
  const names = (await readdir(folder)).sort().reverse();
  for (const name of names) {
    const mail = await readFile(join(folder, name), 'utf8');
    const token = /token=([\w-]+)/.exec(simpleText(mail))?.[1];
    if (mail.includes(`To: ${address}`) && token !== undefined) return token;
  }
  throw new Error(`No mail to ${address} holds a token.`);
}
