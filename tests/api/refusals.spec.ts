import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import sqlite3 from 'sqlite3';
import * as z from 'zod';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problemSchema } from '#shared/api';
import type { Browser } from '../builders/browser';
import { startTestApplication, type TestApplication } from '../builders/test-application';

let application: TestApplication;
let browser: Browser;

beforeAll(async () => {
  application = await startTestApplication({
    sizeLimits: { jsonBodyInBytes: 2048, uploadInBytes: 4096 },
  });
  browser = await application.signedIn(await application.addPerson());
});

afterAll(async () => {
  await application.close();
});

describe('a refusal', () => {
  it('is a problem detail with a way out', async () => {
    const response = await browser.get('/api/nothing');
    expect(response.status).toBe(404);
    expect(response.type).toBe('application/problem+json');
    expect(z.strictObject(problemSchema.shape).parse(response.body)).toEqual({
      type: '/problems/notFound',
      title: 'There is nothing here, or it is not yours to see.',
      status: 404,
      code: 'notFound',
      wayOut: 'Check the address, or ask a lead of the study to add you.',
    });
  });

  it('of a method that a path does not have is the same as of no path', async () => {
    const [method, path] = [
      await browser.put('/api/studies', {}),
      await browser.get('/api/nothing'),
    ];
    expect(method.body).toEqual(path.body);
  });

  it('of a body that is too large says how much is allowed', async () => {
    const response = await browser.post('/api/studies', { title: 'x'.repeat(3000) });
    expect(response.body).toMatchObject({
      status: 413,
      code: 'bodyTooLarge',
      title: 'The request is larger than 2 kB allows.',
    });
    expect(application.bugs).toEqual([]);
  });

  it('of an encoding that is not known is the client’s fault', async () => {
    const response = await browser
      .post('/api/studies')
      .type('json')
      .set('Content-Encoding', 'zebra')
      .send('{}');
    expect(response.body).toMatchObject({ status: 400, code: 'unreadableRequest' });
  });

  it('of a body that only unpacks to too much comes before it is unpacked', async () => {
    const { gzipSync } = await import('node:zlib');
    const bomb = gzipSync(Buffer.from(JSON.stringify({ title: 'x'.repeat(5_000_000) })));
    const response = await browser
      .post('/api/studies')
      .type('json')
      .set('Content-Encoding', 'gzip')
      .serialize((body: unknown) => body as string)
      .send(bomb as unknown as string);
    expect(response.body).toMatchObject({ status: 413 });
  });

  it('of a bug shows nothing of it, and writes it to the log', async () => {
    const own = await startTestApplication();
    const theirs = await own.signedIn(await own.addPerson());
    const { studies } = own.dependencies.database.stores;
    studies.findMany = () => Promise.reject(new Error('secret words of the inside'));
    const response = await theirs.get('/api/studies');
    expect(response.body).toMatchObject({ status: 500, code: 'unexpected' });
    expect(response.text).not.toContain('secret');
    expect(own.bugs[0]).toBe('GET /api/studies failed');
    expect(String(own.bugs[1])).toContain('secret words of the inside');
    await own.close();
  });
});

describe('a database that another program holds', () => {
  it('is said plainly, nothing is half stored, and it recovers by itself', async () => {
    const own = await startTestApplication();
    const theirs = await own.signedIn(await own.addPerson());
    const { dataDirectory } = own.dependencies.config;
    const outside = new sqlite3.Database(join(dataDirectory, 'evenhand.sqlite'));
    const request = { title: 'T', design: 'cohort', peopleNoun: 'people' };
    await execute(outside, 'BEGIN IMMEDIATE');
    const refused = await theirs.post('/api/studies', request);
    expect(refused.body).toMatchObject({ status: 503, code: 'databaseBusy' });
    expect((await theirs.get('/api/studies')).body).toEqual([]);
    await execute(outside, 'COMMIT');
    expect((await theirs.post('/api/studies', request)).status).toBe(201);
    await new Promise((resolve) => {
      outside.close(resolve);
    });
    expect(own.bugs[0]).toBe('POST /api/studies failed');
    await own.close();
  });
});

function execute(database: sqlite3.Database, statement: string): Promise<void> {
  return new Promise((resolve, reject) => {
    database.exec(statement, (problem) => {
      if (problem === null) resolve();
      else reject(problem);
    });
  });
}

describe('hostile bodies', () => {
  it.each([
    ['a prototype', '{"__proto__":{"administrator":true},"title":"T"}'],
    ['deep nesting', `${'['.repeat(900)}${']'.repeat(900)}`],
    ['a bare word', '"title"'],
    ['nothing', 'null'],
    ['a lone surrogate', '{"title":"\\ud800","design":"cohort","peopleNoun":"p"}'],
    ['a zero character', '{"title":"a\\u0000b","design":"cohort","peopleNoun":"p"}'],
  ])('with %s are answered without a bug', async (_name, body) => {
    const response = await browser.post('/api/studies').type('json').send(body);
    expect(response.status).toBeLessThan(500);
    expect(application.bugs).toEqual([]);
  });
});

describe('files that arrive', () => {
  it('leave nothing behind when they are refused', async () => {
    const { dataDirectory } = application.dependencies.config;
    const arriving = await readdir(join(dataDirectory, 'arriving')).catch(() => []);
    expect(arriving).toEqual([]);
  });
});
