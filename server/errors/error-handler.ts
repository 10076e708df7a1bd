import type { ErrorRequestHandler } from 'express';
import { MulterError } from 'multer';
import type { Configuration } from '../config';
import { sendProblem } from './problem';
import type { ServerIssue } from './server-issue';
import { sizeInWords } from './size-in-words';
import { storageIssue } from './storage-issue';

/** Where a bug is written down. */
export type ErrorLog = (message: string, problem: unknown) => void;

/**
 * The one place where an exception becomes an answer. Faults of a request are the client's; what
 * the machine or a bug caused is written to the log, and a bug shows nothing of itself: 500.
 */
export function errorHandler(config: Configuration, log: ErrorLog): ErrorRequestHandler {
  return (problem: unknown, request, response, next) => {
    const fault = requestIssue(problem, config);
    if (fault === null) log(`${request.method} ${request.path} failed`, problem);
    if (response.headersSent) {
      next(problem);
      return;
    }
    sendProblem(response, fault ?? { code: storageIssue(problem) ?? 'unexpected' });
  };
}

function requestIssue(problem: unknown, config: Configuration): ServerIssue | null {
  if (problem instanceof MulterError) return multipartIssue(problem, config);
  switch (bodyParserType(problem)) {
    case 'entity.too.large':
      return {
        code: 'bodyTooLarge',
        facts: { limit: sizeInWords(config.sizeLimits.jsonBodyInBytes) },
      };
    case 'entity.parse.failed':
      return { code: 'unreadableRequest', detail: 'The body is not valid JSON.' };
    case 'charset.unsupported':
    case 'encoding.unsupported':
    case 'request.size.invalid':
    case 'request.aborted':
    case 'badRequest':
      return { code: 'unreadableRequest' };
    default:
      return null;
  }
}

function multipartIssue(problem: MulterError, config: Configuration): ServerIssue {
  return problem.code === 'LIMIT_FILE_SIZE'
    ? { code: 'fileTooLarge', facts: { limit: sizeInWords(config.sizeLimits.uploadInBytes) } }
    : { code: 'unreadableRequest', detail: 'The form does not have the expected fields.' };
}

/** The kinds that body-parser gives its errors, and one for other faults of the client. */
function bodyParserType(problem: unknown): string | null {
  if (!(problem instanceof Error)) return null;
  if ('type' in problem && typeof problem.type === 'string') return problem.type;
  const status = 'status' in problem ? problem.status : null;
  return typeof status === 'number' && status >= 400 && status < 500 ? 'badRequest' : null;
}
