import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { projectRoot, readConfiguration } from './config';

describe('the configuration', () => {
  it('needs nothing from the environment', () => {
    expect(readConfiguration({})).toMatchObject({
      port: 4600,
      publicUrl: 'http://localhost:4600',
      dataDirectory: join(projectRoot(), 'data'),
      smtpUrl: null,
      trustedProxies: 0,
      demonstration: 'seedWhenEmpty',
    });
    expect(existsSync(join(projectRoot(), 'package.json'))).toBe(true);
  });

  it('takes what the environment says', () => {
    const read = readConfiguration({
      PORT: '8080',
      EVENHAND_DATA: '/var/lib/evenhand',
      EVENHAND_PUBLIC_URL: 'https://reports.example.org/',
      EVENHAND_SMTP_URL: 'smtp://mail.example.org:25',
      EVENHAND_DEMONSTRATION: 'no',
    });
    expect(read).toMatchObject({
      port: 8080,
      publicUrl: 'https://reports.example.org',
      dataDirectory: '/var/lib/evenhand',
      smtpUrl: 'smtp://mail.example.org:25',
      trustedProxies: 1,
      demonstration: 'never',
    });
  });

  it('takes an empty variable as none', () => {
    expect(readConfiguration({ PORT: ' ', EVENHAND_SMTP_URL: '' })).toMatchObject({
      port: 4600,
      smtpUrl: null,
    });
  });

  it.each([
    [{ PORT: 'many' }, 'PORT must be a whole number'],
    [{ PORT: '70000' }, 'PORT must be a whole number'],
    [{ PORT: '1.5' }, 'PORT must be a whole number'],
    [{ EVENHAND_PUBLIC_URL: 'reports' }, 'EVENHAND_PUBLIC_URL must be an address'],
    [{ EVENHAND_PUBLIC_URL: 'ftp://reports' }, 'EVENHAND_PUBLIC_URL must be an address'],
    [{ EVENHAND_SMTP_URL: 'mail.example.org' }, 'EVENHAND_SMTP_URL must be an address'],
    [{ EVENHAND_TRUSTED_PROXIES: '-1' }, 'EVENHAND_TRUSTED_PROXIES must be'],
    [{ EVENHAND_DEMONSTRATION: 'maybe' }, 'EVENHAND_DEMONSTRATION must be yes or no'],
  ])('refuses %o in plain words', (environment, message) => {
    expect(() => readConfiguration(environment)).toThrow(message);
  });
});
