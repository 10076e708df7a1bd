import type { Page } from '@playwright/test';
import { DeskPage } from './pages/desk-page';
import { ReportPage } from './pages/report-page';
import { StudyPage } from './pages/study-page';
import type { Credentials } from './sessions';

/** The roles that have a demonstration account. */
export type DemonstrationRole =
  'administrator' | 'lead' | 'analyst' | 'writer' | 'editor' | 'reader';

/** The demonstration studies by short names. Everything in them is invented. */
export const STUDIES = {
  wetWork: 'Wet work and hand eczema in hospital and kitchen staff',
  harbourSupper: 'Harbour supper outbreak',
  reminderLetters: 'Reminder letters and screening uptake',
  screenUse: 'Evening screen use and needing new spectacles',
} as const;

/** What a demonstration account signs in with. */
export function demonstrator(role: DemonstrationRole): Credentials {
  return { email: `${role}@evenhand.example`, password: 'even-handed-demo' };
}

/** Goes from the desk to a study. */
export async function openStudy(page: Page, study: keyof typeof STUDIES): Promise<StudyPage> {
  await new DeskPage(page).open();
  await page.getByRole('main').getByRole('link', { name: STUDIES[study] }).first().click();
  await page.getByRole('heading', { level: 1, name: STUDIES[study] }).waitFor();
  return new StudyPage(page);
}

/** Goes from the desk to the report of a study. */
export async function openReport(page: Page, study: keyof typeof STUDIES): Promise<ReportPage> {
  const place = await openStudy(page, study);
  await place.goTo('Report');
  await page.getByRole('main').getByRole('listitem').getByRole('link').first().click();
  const report = new ReportPage(page);
  await report.block('Table 1').waitFor();
  return report;
}
