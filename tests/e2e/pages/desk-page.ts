import type { Page } from '@playwright/test';

/** A study to begin, in the words of its form. */
export interface StudyWords {
  readonly title: string;
  /** As the list names it: "Cohort", "Case–control". */
  readonly design: string;
  readonly people: string;
}

/** The desk, from which studies are begun. */
export class DeskPage {
  constructor(private readonly page: Page) {}

  async open(): Promise<void> {
    await this.page.goto('/desk');
    await this.page.getByRole('heading', { level: 1, name: 'Your desk' }).waitFor();
  }

  async beginStudy({ title, design, people }: StudyWords): Promise<void> {
    await this.page.getByRole('banner').getByRole('button', { name: 'New study' }).click();
    const dialog = this.page.getByRole('dialog', { name: 'New study' });
    await dialog.getByLabel('Title').fill(title);
    await dialog.getByLabel('Design').selectOption(design);
    await dialog.getByLabel('Who the records are').fill(people);
    await dialog.getByRole('button', { name: 'Begin the study' }).click();
    await this.page.getByRole('heading', { level: 1, name: title }).waitFor();
  }
}
