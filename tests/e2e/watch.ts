import type { BrowserContext, ConsoleMessage } from '@playwright/test';

/** What no page may do: write an error to the console, break its policy, call another host. */
export interface Watch {
  /** What went wrong so far, in the order in which it did. */
  readonly complaints: readonly string[];
  /** Watches a browser context from now on. */
  readonly over: (context: BrowserContext) => void;
}

/** A failed request that a test brings about itself, by its status. */
export type ExpectedStatuses = readonly number[];

/** Watches over contexts; the server may answer with these statuses without complaint. */
export function startWatch(address: string, expected: ExpectedStatuses): Watch {
  const complaints: string[] = [];
  return {
    complaints,
    over: (context) => {
      context.on('weberror', (problem) => complaints.push(`error: ${problem.error().stack ?? ''}`));
      context.on('console', (message) => {
        if (isComplaint(message, expected)) complaints.push(`console: ${message.text()}`);
      });
      context.on('request', (request) => {
        if (isElsewhere(request.url(), address)) complaints.push(`request: ${request.url()}`);
      });
    },
  };
}

function isComplaint(message: ConsoleMessage, expected: ExpectedStatuses): boolean {
  if (message.type() !== 'error') return message.type() === 'warning';
  const [, status] = /responded with a status of (\d{3})/.exec(message.text()) ?? [];
  return status === undefined || !expected.includes(Number(status));
}

function isElsewhere(url: string, address: string): boolean {
  return !url.startsWith(`${address}/`) && !/^(?:data|blob|about):/.test(url);
}
