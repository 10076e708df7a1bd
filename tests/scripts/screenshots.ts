import { mkdirSync } from 'node:fs';
import { chromium, type Browser, type Page } from '@playwright/test';
import { DEMONSTRATION_PASSWORD } from '../../seeds/accounts';
import { startApplication } from '../e2e/application';
import { signInByApi } from '../e2e/sessions';
import { findBrowser } from './browser.mjs';

/** A picture of the tour: which page of which study, how wide, light or dark. */
interface Picture {
  readonly name: string;
  readonly study: string;
  readonly page: 'desk' | 'codeBook' | 'bench' | 'report';
  readonly width: number;
  readonly theme: 'light' | 'dark';
}

const FOLDER = 'client/tour';
const WET_WORK = 'Wet work';

const PICTURES: readonly Picture[] = [
  { name: 'desk', study: WET_WORK, page: 'desk', width: 1440, theme: 'light' },
  { name: 'code-book', study: WET_WORK, page: 'codeBook', width: 1440, theme: 'light' },
  { name: 'bench', study: WET_WORK, page: 'bench', width: 1440, theme: 'light' },
  { name: 'report', study: WET_WORK, page: 'report', width: 1440, theme: 'light' },
  { name: 'report-dark', study: WET_WORK, page: 'report', width: 1440, theme: 'dark' },
  { name: 'report-phone', study: 'Harbour supper', page: 'report', width: 390, theme: 'light' },
];

mkdirSync(FOLDER, { recursive: true });
const application = await startApplication('demonstration');
const executablePath = findBrowser();
const browser = await chromium.launch({
  ...(executablePath === undefined ? {} : { executablePath }),
  args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking'],
});
for (const picture of PICTURES) await take(browser, picture);
await browser.close();
await application.stop();

async function take(
  from: Browser,
  { name, study, page: place, width, theme }: Picture,
): Promise<void> {
  const context = await from.newContext({
    baseURL: application.address,
    viewport: { width, height: width < 720 ? 844 : 960 },
    colorScheme: theme,
    reducedMotion: 'reduce',
  });
  const credentials = { email: 'lead@evenhand.example', password: DEMONSTRATION_PASSWORD };
  await signInByApi(context.request, credentials);
  const page = await context.newPage();
  await page.goto(await addressOf(page, study, place));
  await page.waitForLoadState('networkidle');
  await page.waitForTimeout(1500);
  await page.screenshot({ path: `${FOLDER}/${name}.png` });
  await context.close();
  console.log(`${FOLDER}/${name}.png`);
}

interface Listed {
  readonly id: string;
  readonly title?: string;
}

async function addressOf(page: Page, study: string, place: Picture['page']): Promise<string> {
  const list = async (path: string): Promise<readonly Listed[]> =>
    (await (await page.request.get(path)).json()) as readonly Listed[];
  const studies = await list('/api/studies');
  const id = studies.find(({ title }) => title?.includes(study))?.id ?? '';
  const first = async (part: string): Promise<string> =>
    (await list(`/api/studies/${id}/${part}`))[0]?.id ?? '';
  switch (place) {
    case 'desk':
      return '/desk';
    case 'codeBook':
      return `/studies/${id}/code-book/${await first('data-sets')}`;
    case 'bench':
      return `/studies/${id}/analyses/${await first('analyses')}`;
    case 'report':
      return `/studies/${id}/reports/${await first('reports')}`;
  }
}
