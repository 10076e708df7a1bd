import { extname, join } from 'node:path';
import express, { Router, type Request, type Response } from 'express';
import { serveCompressed } from './serve-compressed';

const HASHED_NAME = /-[A-Z0-9]{8,}\.\w+$/;
const A_YEAR = 'public, max-age=31536000, immutable';

/**
 * Serves the built client. A file whose name holds a hash of its content may be kept for ever; the
 * page itself is asked for each time. Every address without a file is the application's to answer.
 */
export function serveClient(clientDirectory: string): Router {
  const router = Router();
  router.use(serveCompressed(clientDirectory, keepHashedFiles));
  router.use(express.static(clientDirectory, { index: false, setHeaders: keepHashedFiles }));
  router.get('/{*path}', (request, response, next) => {
    if (extname(request.path) !== '') next();
    else sendPage(clientDirectory, response);
  });
  router.use(nothingHere);
  return router;
}

function keepHashedFiles(response: Response, path: string): void {
  response.set('Cache-Control', HASHED_NAME.test(path) ? A_YEAR : 'no-cache');
}

function sendPage(clientDirectory: string, response: Response): void {
  response.set('Cache-Control', 'no-cache');
  response.sendFile(join(clientDirectory, 'index.html'), (problem?: Error) => {
    if (problem === undefined || response.headersSent) return;
    response
      .status(503)
      .type('text/plain')
      .send('The pages have not been built yet. Run "npm run build", then reload.\n');
  });
}

function nothingHere(_request: Request, response: Response): void {
  response.status(404).type('text/plain').send('There is nothing here.\n');
}
