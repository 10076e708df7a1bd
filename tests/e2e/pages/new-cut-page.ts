import { expect, type Locator, type Page } from '@playwright/test';
import { CodeBookEditor } from './code-book-editor';

/** The steps of a new cut that can be gone to. */
export type CutStep = 'Upload' | 'Columns' | 'Code book' | 'Check';

/** How the rows of a file count, as the page names it. */
export type CountLayout =
  'A record a row' | 'One count column' | 'Events and total' | 'Cases and controls';

/** The page that makes a cut of a file, step by step. */
export class NewCutPage {
  readonly codeBook: CodeBookEditor;

  constructor(private readonly page: Page) {
    this.codeBook = new CodeBookEditor(page);
  }

  /** From the list of data, for a new data set. */
  async open(): Promise<void> {
    await this.page.getByRole('link', { name: 'Load a file' }).click();
    await this.page.getByRole('heading', { level: 1, name: 'New data cut' }).waitFor();
  }

  /** Sends a file; it is read when this ends, or refused. */
  async upload(path: string): Promise<void> {
    await this.page.getByLabel(/Pick (?:a|another) file/).setInputFiles(path);
  }

  /** What the page says of the file that was read. */
  get read(): Locator {
    return this.page.getByText(/is read: [\d,]+ rows, \d+ columns\./);
  }

  /** Why the file was not read. */
  get refusal(): Locator {
    return this.page.getByRole('main').getByRole('alert');
  }

  async goTo(step: CutStep): Promise<void> {
    const steps = this.page.getByRole('main').getByRole('list').first();
    await steps.getByRole('button', { name: step }).click();
  }

  /** How the rows count, as the page guessed or somebody chose. */
  layout(name: CountLayout): Locator {
    const group = this.page.getByRole('group', { name: 'How the rows count' });
    return group.getByRole('radio', { name });
  }

  /** What a column of the file is. */
  kindOf(column: string): Locator {
    return this.page.getByLabel(`What ${column} is`);
  }

  /** A note in the margin, by the column or file that it is about. */
  note(text: string | RegExp): Locator {
    return this.page.getByRole('complementary', { name: 'To settle' }).getByText(text);
  }

  /** Gives name and date, and makes the cut. */
  async make({ name, date }: { readonly name: string; readonly date: string }): Promise<void> {
    await this.goTo('Check');
    await this.page.getByLabel('Name of the data set').fill(name);
    await this.page.getByLabel('Date of the data').fill(date);
    await this.page.getByRole('banner').getByRole('button', { name: 'Make the cut' }).click();
    const done = this.page.getByRole('heading', { name: `Cut 1 of ${name} is made` });
    await expect(done).toBeVisible({ timeout: 30_000 });
  }

  /** Makes the next cut of a data set that there is already. */
  async makeNext(date: string): Promise<void> {
    await this.goTo('Check');
    await this.page.getByLabel('Date of the data').fill(date);
    await this.page.getByRole('banner').getByRole('button', { name: 'Make the cut' }).click();
    await expect(this.page.getByRole('heading', { name: /^Cut \d+ of .+ is made$/ })).toBeVisible();
  }

  async startAnalysis(): Promise<void> {
    await this.page.getByRole('link', { name: 'Start an analysis' }).click();
    await this.page.getByRole('heading', { level: 1, name: 'New analysis' }).waitFor();
  }
}
