import { randomUUID } from 'node:crypto';
import { chromium, type APIRequestContext, type Page } from '@playwright/test';
import type { ReportView } from '#shared/api';
import { generateNKeysBetween } from 'fractional-indexing';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { DEMONSTRATION_PASSWORD } from '../../seeds/accounts';
import { startApplication, type RunningApplication } from '../e2e/application';
import { send, signInByApi } from '../e2e/sessions';
import { findBrowser } from '../scripts/browser.mjs';
import { report as tell, timingOf } from './measure';

const BLOCKS = 60;
const PRESSES = 24;

let application: RunningApplication;

beforeAll(async () => {
  application = await startApplication('demonstration');
}, 120_000);

afterAll(async () => {
  await application.stop();
});

/** Needs the built application: `npm run build` first. */
it('toggles the framing of a report of 60 blocks, to the next paint', async () => {
  const browser = await chromium.launch({
    executablePath: findBrowser() ?? '',
    args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking'],
  });
  const viewport = { width: 1440, height: 900 };
  const context = await browser.newContext({ baseURL: application.address, viewport });
  const credentials = { email: 'lead@evenhand.example', password: DEMONSTRATION_PASSWORD };
  await signInByApi(context.request, credentials);
  const page = await context.newPage();
  await page.goto(await largeReportPage(context.request));
  await expect.poll(() => page.locator('eh-proof-block').count()).toBe(BLOCKS);
  await page.waitForLoadState('networkidle');
  const floor = await pressesOf(page, ['Keys'], 8);
  const toggles = await pressesOf(page, ['Absolute', 'Relative', 'Both'], PRESSES);
  await browser.close();
  expect(toggles.paints.length).toBeGreaterThan(PRESSES / 2);
  tell({
    what: `toggle the framing of a report of ${String(BLOCKS)} blocks, press to paint`,
    budgetInMilliseconds: 50,
    timing: timingOf(toggles.paints),
    floor: { what: 'opening the list of keys', timing: timingOf(floor.paints) },
  });
  tell({
    what: 'longest task of the main thread during a toggle (0: none above 50 ms)',
    budgetInMilliseconds: 50,
    timing: timingOf(toggles.longTasks.length > 0 ? toggles.longTasks : [0]),
    floor: null,
  });
});

/** Fills the first report of the first demonstration study up to 60 blocks, by its own blocks. */
async function largeReportPage(request: APIRequestContext): Promise<string> {
  const read = async <Answer>(path: string): Promise<Answer> =>
    (await (await request.get(path)).json()) as Answer;
  const studies = await read<readonly { id: string; title: string }[]>('/api/studies');
  const study = studies.find(({ title }) => title.startsWith('Wet work'))!;
  const [first] = await read<readonly { id: string }[]>(`/api/studies/${study.id}/reports`);
  const place = `/studies/${study.id}/reports/${first!.id}`;
  const { report } = await read<ReportView>(`/api${place}`);
  const shown = report.blocks.filter(({ removedAt }) => removedAt === null);
  const last = shown
    .map(({ orderKey }) => orderKey)
    .toSorted()
    .at(-1)!;
  const keys = generateNKeysBetween(last, null, BLOCKS - shown.length);
  const steps = keys.map((orderKey, index) => {
    const { kind, content } = shown[index % shown.length]!;
    const block = { id: randomUUID(), kind, orderKey, content };
    const step = { kind: 'insertBlock', block };
    return { id: randomUUID(), groupId: randomUUID(), undoes: null, step };
  });
  await send(request, 'POST', `/api${place}/steps`, { steps });
  return place;
}

interface Presses {
  /** From the press to the next paint, as the browser itself times events; 8 ms at the finest. */
  readonly paints: readonly number[];
  /** Tasks above 50 ms. */
  readonly longTasks: readonly number[];
}

async function pressesOf(page: Page, names: readonly string[], presses: number): Promise<Presses> {
  await page.evaluate(watch);
  for (let press = 0; press < presses; press += 1) {
    const name = names[press % names.length]!;
    await page.locator('header, nav').getByText(name, { exact: true }).first().click();
    await page.waitForTimeout(700);
    if (name === 'Keys') await page.keyboard.press('Escape');
  }
  return page.evaluate(() => (globalThis as unknown as { seen: Presses }).seen);
}

/** Runs in the page. */
function watch(): void {
  const paints: number[] = [];
  const longTasks: number[] = [];
  Object.assign(globalThis, { seen: { paints, longTasks } });
  new PerformanceObserver((list) => {
    for (const entry of list.getEntries()) if (entry.name === 'click') paints.push(entry.duration);
  }).observe({ type: 'event', durationThreshold: 16 } as PerformanceObserverInit);
  new PerformanceObserver((list) => {
    for (const entry of list.getEntries()) longTasks.push(entry.duration);
  }).observe({ type: 'longtask' });
}
