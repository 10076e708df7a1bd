import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { brotliCompressSync } from 'node:zlib';
import express from 'express';
import supertest from 'supertest';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { serveClient } from './serve-client';

const SCRIPT = 'console.log("even");'.repeat(100);
let directory: string;

beforeAll(() => {
  directory = mkdtempSync(join(tmpdir(), 'evenhand-client-'));
  writeFileSync(join(directory, 'main-ABCDEFGH.js'), SCRIPT);
  writeFileSync(join(directory, 'main-ABCDEFGH.js.br'), brotliCompressSync(SCRIPT));
  writeFileSync(join(directory, 'plain.js'), SCRIPT);
});

afterAll(() => {
  rmSync(directory, { recursive: true });
});

function get(path: string, encodings: string) {
  const app = express().use(serveClient(directory));
  return supertest(app).get(path).set('Accept-Encoding', encodings);
}

it('sends the compressed form, with the type and the lasting name of the file itself', async () => {
  const response = await get('/main-ABCDEFGH.js', 'gzip, br').buffer(false);
  expect(response.headers).toMatchObject({
    'content-encoding': 'br',
    'content-type': 'text/javascript; charset=utf-8',
    'content-length': String(brotliCompressSync(SCRIPT).length),
    'cache-control': 'public, max-age=31536000, immutable',
  });
  expect(response.headers.vary).toContain('Accept-Encoding');
});

it('sends the file itself to whoever does not take brotli', async () => {
  const response = await get('/main-ABCDEFGH.js', 'gzip');
  expect(response.headers['content-encoding']).toBeUndefined();
  expect(response.headers.vary).toContain('Accept-Encoding');
  expect(response.text).toBe(SCRIPT);
});

it('sends files without a compressed form as they are', async () => {
  expect((await get('/plain.js', 'br')).text).toBe(SCRIPT);
});

it('sends the file itself when a build has taken the compressed form away', async () => {
  writeFileSync(join(directory, 'gone.js'), SCRIPT);
  writeFileSync(join(directory, 'gone.js.br'), brotliCompressSync(SCRIPT));
  const app = express().use(serveClient(directory));
  rmSync(join(directory, 'gone.js.br'));
  const response = await supertest(app).get('/gone.js').set('Accept-Encoding', 'br');
  expect([response.status, response.headers['content-encoding'], response.text]).toEqual([
    200,
    undefined,
    SCRIPT,
  ]);
});
