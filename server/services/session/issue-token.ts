import { createHash } from 'node:crypto';
import type { Dependencies } from '../../dependencies';
import type { TokenPurpose } from '../../models/token/token-model';
import type { Unit } from '../../models/unit-of-work';

const HOUR_IN_MILLISECONDS = 3_600_000;

/** How long a mailed link works. */
const LIFETIME_IN_MILLISECONDS: Readonly<Record<TokenPurpose, number>> = {
  passwordReset: HOUR_IN_MILLISECONDS,
  invitation: 7 * 24 * HOUR_IN_MILLISECONDS,
};

/** Makes a token for a person and keeps its hash; gives the link to mail. */
export async function issueToken(
  { database, clock, randomness, config }: Dependencies,
  userId: string,
  purpose: TokenPurpose,
  unit: Unit,
): Promise<string> {
  const token = randomness(32).toString('base64url');
  const now = clock.now();
  const expiresAt = new Date(now.getTime() + LIFETIME_IN_MILLISECONDS[purpose]).toISOString();
  await database.stores.tokens.insert(
    {
      hash: hashToken(token),
      purpose,
      userId,
      createdAt: now.toISOString(),
      expiresAt,
      usedAt: null,
    },
    unit,
  );
  return linkTo(config.publicUrl, token);
}

/** The form in which a token is kept. It is random, so that a plain hash is enough. */
export function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}

function linkTo(publicUrl: string, token: string): string {
  return `${publicUrl}/reset-password?token=${token}`;
}
