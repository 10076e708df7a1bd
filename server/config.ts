import { existsSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** How hard a password hash is to compute (argon2id): memory in KiB, passes over it. */
export interface PasswordCost {
  readonly memoryInKibibytes: number;
  readonly passes: number;
}

/** Limits of what a request may weigh, in bytes. */
export interface SizeLimits {
  readonly jsonBodyInBytes: number;
  readonly uploadInBytes: number;
}

/** Everything that differs between installations. */
export interface Configuration {
  readonly port: number;
  /** The address people open, without a slash at the end; links in mail begin with it. */
  readonly publicUrl: string;
  readonly dataDirectory: string;
  readonly clientDirectory: string;
  readonly templatesDirectory: string;
  /** Where mail goes; null keeps it in the outbox on disk. */
  readonly smtpUrl: string | null;
  readonly mailSender: string;
  /** How many reverse proxies stand before the server; 0 for none. */
  readonly trustedProxies: number;
  readonly passwordCost: PasswordCost;
  readonly sizeLimits: SizeLimits;
  /** Failed sign-ins that one network address may make in ten minutes. */
  readonly failedSignInsPerAddress: number;
  /** Whether an empty database is filled with the invented demonstration studies. */
  readonly demonstration: 'seedWhenEmpty' | 'never';
  /** Tests check every answer against its schema; serving skips the cost. */
  readonly answers: 'checked' | 'trusted';
}

/** Values that installations rarely change. */
export const DEFAULT_LIMITS = {
  passwordCost: { memoryInKibibytes: 19_456, passes: 2 },
  sizeLimits: { jsonBodyInBytes: 8 * 1024 * 1024, uploadInBytes: 512 * 1024 * 1024 },
  failedSignInsPerAddress: 50,
} as const;

/** Reads the configuration from environment variables; throws on a value that can't be used. */
export function readConfiguration(
  environment: Readonly<Record<string, string | undefined>>,
): Configuration {
  const root = projectRoot();
  const port = wholeNumber(environment, 'PORT', 4600, 65_535);
  const address = publicUrl(environment.EVENHAND_PUBLIC_URL, port);
  return {
    port,
    publicUrl: address,
    dataDirectory: resolve(environment.EVENHAND_DATA ?? join(root, 'data')),
    clientDirectory: join(root, 'dist', 'client'),
    templatesDirectory: join(root, 'templates'),
    smtpUrl: smtpUrl(environment.EVENHAND_SMTP_URL),
    mailSender: filled(environment.EVENHAND_MAIL_FROM) ?? 'Evenhand <evenhand@localhost>',
    trustedProxies: wholeNumber(environment, 'EVENHAND_TRUSTED_PROXIES', proxies(address), 16),
    ...DEFAULT_LIMITS,
    demonstration: demonstration(environment.EVENHAND_DEMONSTRATION),
    answers: 'trusted',
  };
}

/** The folder that holds package.json, whether this runs from sources or from the bundle. */
export function projectRoot(): string {
  let folder = dirname(fileURLToPath(import.meta.url));
  while (!existsSync(join(folder, 'package.json'))) {
    const parent = dirname(folder);
    if (parent === folder) throw new Error('The folder of the project was not found.');
    folder = parent;
  }
  return folder;
}

function publicUrl(given: string | undefined, port: number): string {
  const address = filled(given) ?? `http://localhost:${String(port)}`;
  const url = URL.canParse(address) ? new URL(address) : null;
  if (url === null || !['http:', 'https:'].includes(url.protocol)) {
    throw new Error(`EVENHAND_PUBLIC_URL must be an address such as https://reports.example.org.`);
  }
  return address.replace(/\/+$/, '');
}

function smtpUrl(given: string | undefined): string | null {
  const address = filled(given);
  if (address === null || /^smtps?:\/\/[^/]/.test(address)) return address;
  throw new Error('EVENHAND_SMTP_URL must be an address such as smtp://mail.example.org:587.');
}

/** The server itself speaks plain HTTP, so that an https address means a proxy before it. */
function proxies(address: string): number {
  return address.startsWith('https:') ? 1 : 0;
}

function demonstration(given: string | undefined): Configuration['demonstration'] {
  const value = filled(given) ?? 'yes';
  if (value !== 'yes' && value !== 'no') {
    throw new Error('EVENHAND_DEMONSTRATION must be yes or no.');
  }
  return value === 'yes' ? 'seedWhenEmpty' : 'never';
}

function wholeNumber(
  environment: Readonly<Record<string, string | undefined>>,
  name: string,
  otherwise: number,
  largest: number,
): number {
  const given = filled(environment[name]);
  const value = given === null ? otherwise : Number(given);
  if (Number.isInteger(value) && value >= 0 && value <= largest) return value;
  throw new Error(`${name} must be a whole number from 0 to ${String(largest)}.`);
}

function filled(value: string | undefined): string | null {
  const trimmed = value?.trim() ?? '';
  return trimmed === '' ? null : trimmed;
}
