import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import type { Configuration } from '../config';
import { sendProblem } from '../errors/problem';

const WINDOW_IN_MILLISECONDS = 10 * 60 * 1000;

/** Limits that a route may name: guesses of secrets count when they fail, mails always. */
export type LimitName = 'guess' | 'mail';

/** One counter per limit and network address, kept in memory. */
export type Limits = Readonly<Record<LimitName, RequestHandler>>;

/** Makes the counters of one application. */
export function createLimits(config: Configuration): Limits {
  return {
    guess: limit(config.failedSignInsPerAddress, 'failed'),
    mail: limit(Math.ceil(config.failedSignInsPerAddress / 2), 'all'),
  };
}

function limit(most: number, counted: 'failed' | 'all'): RequestHandler {
  return rateLimit({
    windowMs: WINDOW_IN_MILLISECONDS,
    limit: most,
    skipSuccessfulRequests: counted === 'failed',
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: (_request, response) => {
      const seconds = Number(response.get('Retry-After') ?? WINDOW_IN_MILLISECONDS / 1000);
      sendProblem(response, { code: 'tooManyRequests', facts: { seconds } });
    },
  });
}
