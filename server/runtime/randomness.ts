import { randomBytes } from 'node:crypto';

/** Gives so many unpredictable bytes. */
export type Randomness = (length: number) => Buffer;

/** The randomness of the operating system. */
export const systemRandomness: Randomness = (length) => randomBytes(length);
