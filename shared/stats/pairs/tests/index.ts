import { mcnemar } from './mcnemar';
import { mcnemarExact } from './mcnemar-exact';
import { mcnemarMidP } from './mcnemar-mid-p';

/** Tests of paired counts, in the order in which they are offered. */
export const PAIRED_TESTS = { mcnemar, mcnemarExact, mcnemarMidP } as const;

/** Id of a test of paired counts. */
export type PairedTestId = keyof typeof PAIRED_TESTS;
