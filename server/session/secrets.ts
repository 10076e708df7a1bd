import { createHmac } from 'node:crypto';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Randomness } from '../runtime/randomness';

/** Keys of this installation; they lie in the data directory and never leave it. */
export interface Secrets {
  /** Signs session cookies. */
  readonly session: string;
  /** Signs the tokens against forged requests. */
  readonly forgery: Buffer;
  /** Seals the entries of the trail. */
  readonly trail: Buffer;
}

/** Reads the keys; makes them (mode 0600) where they are missing. */
export function readSecrets(dataDirectory: string, randomness: Randomness): Secrets {
  mkdirSync(dataDirectory, { recursive: true, mode: 0o700 });
  const session = secretFile(join(dataDirectory, 'session-secret'), randomness);
  const trail = secretFile(join(dataDirectory, 'trail-key'), randomness);
  return {
    session,
    forgery: createHmac('sha256', session).update('forgery').digest(),
    trail: Buffer.from(trail, 'hex'),
  };
}

function secretFile(path: string, randomness: Randomness): string {
  try {
    writeFileSync(path, randomness(32).toString('hex'), { mode: 0o600, flag: 'wx' });
  } catch (problem) {
    if (!(problem instanceof Error && 'code' in problem && problem.code === 'EEXIST'))
      throw problem;
  }
  const secret = readFileSync(path, 'utf8').trim();
  if (/^[0-9a-f]{64}$/.test(secret)) return secret;
  throw new Error(
    `${path} does not hold a key; restore it from a back-up, or remove it for a new one.`,
  );
}
