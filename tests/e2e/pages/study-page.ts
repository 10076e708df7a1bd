import type { Page } from '@playwright/test';

/** An outcome and its words. */
export interface OutcomeWords {
  readonly noun: string;
  readonly verbPhrase: string;
  readonly timeFrame?: string;
  readonly event: 'Harmful' | 'Beneficial';
}

/** A section of the open study, as the spine names it. */
export type Section = 'Desk' | 'Study' | 'Data' | 'Code book' | 'Analyses' | 'Report';

/** The page of a study, and the ways to its other pages. */
export class StudyPage {
  constructor(private readonly page: Page) {}

  async wordOutcome({ noun, verbPhrase, timeFrame, event }: OutcomeWords): Promise<void> {
    await this.page.getByRole('button', { name: 'Add an outcome' }).click();
    const dialog = this.page.getByRole('dialog', { name: 'New outcome' });
    await dialog.getByLabel('Noun').fill(noun);
    await dialog.getByLabel('Verb phrase').fill(verbPhrase);
    if (timeFrame !== undefined) await dialog.getByLabel('Time frame').fill(timeFrame);
    await dialog.getByRole('radio', { name: event }).check();
    await dialog.getByRole('button', { name: 'Save the outcome' }).click();
    await dialog.waitFor({ state: 'hidden' });
  }

  async goTo(section: Section): Promise<void> {
    const spine = this.page.getByRole('navigation', { name: 'Sections' });
    await spine.getByRole('link', { name: section, exact: true }).click();
  }
}
