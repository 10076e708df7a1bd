import { hash, verify } from '@node-rs/argon2';
import type { PasswordCost } from '../config';

/** Hashes and checks passwords (argon2id, salted). */
export interface Passwords {
  readonly hash: (password: string) => Promise<string>;
  /** Whether the password belongs to the hash. Without a hash it takes as long and says no. */
  readonly verify: (storedHash: string | null, password: string) => Promise<boolean>;
}

/** Makes the hasher; its first work is a hash that stands in for accounts that do not exist. */
export async function createPasswords(cost: PasswordCost): Promise<Passwords> {
  const options = { memoryCost: cost.memoryInKibibytes, timeCost: cost.passes, parallelism: 1 };
  const standIn = await hash('no password at all', options);
  return {
    hash: (password) => hash(password.normalize('NFKC'), options),
    verify: async (storedHash, password) => {
      const matches = await verify(storedHash ?? standIn, password.normalize('NFKC'));
      return matches && storedHash !== null;
    },
  };
}
