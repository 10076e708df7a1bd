import { existsSync, readdirSync } from 'node:fs';
import { extname, join, sep } from 'node:path';
import type { RequestHandler, Response } from 'express';

/**
 * Sends the compressed form of a file that the build made, to browsers that take it (brotli).
 * `setHeaders` is told the path of the file itself. Everything else is left to the next handler.
 */
export function serveCompressed(
  directory: string,
  setHeaders: (response: Response, path: string) => void,
): RequestHandler {
  const made = compressedPaths(directory);
  return (request, response, next) => {
    if (!made.has(request.path)) {
      next();
      return;
    }
    response.vary('Accept-Encoding');
    if (!['GET', 'HEAD'].includes(request.method) || request.acceptsEncodings('br') !== 'br') {
      next();
      return;
    }
    response.set('Content-Encoding', 'br').type(extname(request.path));
    setHeaders(response, request.path);
    response.sendFile(join(directory, `${request.path}.br`), (problem?: Error) => {
      if (problem === undefined || response.headersSent) return;
      // A build that runs meanwhile has taken it away; the file itself may still be there.
      response.removeHeader('Content-Encoding');
      next();
    });
  };
}

/** Addresses of the files that have a compressed form. */
function compressedPaths(directory: string): ReadonlySet<string> {
  if (!existsSync(directory)) return new Set();
  const files = readdirSync(directory, { recursive: true, encoding: 'utf8' });
  return new Set(
    files
      .filter((file) => file.endsWith('.br'))
      .map((file) => `/${file.slice(0, -'.br'.length).split(sep).join('/')}`),
  );
}
