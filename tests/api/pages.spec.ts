import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestApplication, type TestApplication } from '../builders/test-application';

const PAGE = '<!doctype html><title>Evenhand</title><script src="main-ABCDEFGH.js"></script>';

let application: TestApplication;
let clientDirectory: string;

beforeAll(async () => {
  clientDirectory = await mkdtemp(join(tmpdir(), 'evenhand-client-'));
  await mkdir(join(clientDirectory, 'media'));
  await writeFile(join(clientDirectory, 'index.html'), PAGE);
  await writeFile(
    join(clientDirectory, 'main-ABCDEFGH.js'),
    'const words = "even hand ";\n'.repeat(200),
  );
  await writeFile(join(clientDirectory, 'media', 'plex-Z9Y8X7W6.woff2'), 'font');
  await writeFile(join(clientDirectory, 'favicon.svg'), '<svg/>');
  application = await startTestApplication({ clientDirectory });
});

afterAll(async () => {
  await application.close();
  await rm(clientDirectory, { recursive: true });
  expect(application.bugs).toEqual([]);
});

function get(path: string) {
  return supertest(application.app).get(path);
}

describe('the pages', () => {
  it.each(['/', '/studies/0198/reports/7', '/sign-in'])('are one page at %s', async (path) => {
    const response = await get(path);
    expect(response.status).toBe(200);
    expect(response.text).toBe(PAGE);
    expect(response.headers['cache-control']).toBe('no-cache');
  });

  it.each(['/main-ABCDEFGH.js', '/media/plex-Z9Y8X7W6.woff2'])(
    'keep %s for ever, since its name holds its hash',
    async (path) => {
      const response = await get(path);
      expect(response.status).toBe(200);
      expect(response.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    },
  );

  it('ask again for files without a hash', async () => {
    expect((await get('/favicon.svg')).headers['cache-control']).toBe('no-cache');
  });

  it('are sent compressed', async () => {
    const response = await get('/main-ABCDEFGH.js').set('Accept-Encoding', 'gzip');
    expect(response.headers['content-encoding']).toBe('gzip');
  });

  it('do not stand in for files that are not there', async () => {
    const response = await get('/main-OLDOLDOL.js');
    expect(response.status).toBe(404);
    expect(response.text).toBe('There is nothing here.\n');
  });

  it.each(['/../package.json', '/%2e%2e/package.json', '/..%2fpackage.json'])(
    'give nothing outside their folder: %s',
    async (path) => {
      const response = await get(path);
      expect(response.text).not.toContain('dependencies');
      expect([403, 404]).toContain(response.status);
    },
  );

  it('say what to do when they have not been built', async () => {
    const unbuilt = await startTestApplication({ clientDirectory: join(clientDirectory, 'none') });
    const response = await supertest(unbuilt.app).get('/');
    expect(response.status).toBe(503);
    expect(response.text).toContain('npm run build');
    await unbuilt.close();
  });
});

describe('the headers', () => {
  it.each(['/', '/api/session', '/api/nothing'])('guard %s', async (path) => {
    const { headers } = await get(path);
    const policy = new Map(
      String(headers['content-security-policy'])
        .split(';')
        .map((directive) => {
          const [name = '', ...sources] = directive.trim().split(' ');
          return [name, sources] as const;
        }),
    );
    expect(policy.get('default-src')).toEqual(["'self'"]);
    expect(policy.get('script-src')).toEqual(["'self'"]);
    expect(policy.get('script-src-attr')).toEqual(["'none'"]);
    expect(policy.get('object-src')).toEqual(["'none'"]);
    expect(policy.get('frame-ancestors')).toEqual(["'none'"]);
    expect(policy.get('base-uri')).toEqual(["'self'"]);
    expect([...policy.values()].flat()).not.toContain("'unsafe-eval'");
    expect(headers).toMatchObject({
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'no-referrer',
      'x-frame-options': 'DENY',
    });
    expect(headers['x-powered-by']).toBeUndefined();
  });

  it('keep answers of the API out of caches', async () => {
    expect((await get('/api/session')).headers['cache-control']).toBe('no-store');
  });

  it('ask for encryption only where the address is https', async () => {
    const { headers } = await get('/');
    expect(headers['strict-transport-security']).toBeUndefined();
    expect(headers['content-security-policy']).not.toContain('upgrade-insecure-requests');
    const secure = await startTestApplication({
      publicUrl: 'https://reports.example.org',
      trustedProxies: 1,
    });
    const encrypted = await supertest(secure.app).get('/').set('X-Forwarded-Proto', 'https');
    expect(encrypted.headers['strict-transport-security']).toContain('max-age=');
    expect(encrypted.headers['content-security-policy']).toContain('upgrade-insecure-requests');
    await secure.close();
  });

  it('guard the cookies where the address is https', async () => {
    const secure = await startTestApplication({
      publicUrl: 'https://reports.example.org',
      trustedProxies: 1,
    });
    const person = await secure.addPerson();
    const agent = supertest(secure.app);
    const page = await agent.get('/api/session').set('X-Forwarded-Proto', 'https');
    const [tokenCookie] = page.headers['set-cookie'] as unknown as [string];
    expect(tokenCookie).toContain('; Secure');
    const token = tokenCookie.split(';')[0]!.slice('XSRF-TOKEN='.length);
    const response = await agent
      .post('/api/session')
      .set('X-Forwarded-Proto', 'https')
      .set('Cookie', `XSRF-TOKEN=${token}`)
      .set('X-XSRF-TOKEN', token)
      .send({ email: person.email, password: 'a long enough password' });
    expect(response.status).toBe(200);
    const cookies = response.headers['set-cookie'] as unknown as string[];
    expect(cookies.find((cookie) => cookie.startsWith('__Host-evenhand='))).toContain('; Secure');
    await secure.close();
  });
});
