import { expect, type Locator, type Page } from '@playwright/test';

/** What can be picked in the contrast sentence, by name. */
export type Pick =
  | 'Outcome'
  | 'Exposure'
  | 'Reference level'
  | 'Strata'
  | 'Column of the outcome'
  | 'What counts as the event'
  | 'Data cut'
  | 'Records';

/** A contrast, in the words of the pickers. */
export interface Contrast {
  readonly outcome: string;
  readonly outcomeColumn?: string;
  readonly event?: string;
  readonly exposure: string;
  readonly reference: string;
  readonly strata?: readonly string[];
}

const TABLES = {
  counts: /^Counts/,
  estimates: /^Every level against/,
  pooled: /pooled/i,
} as const;

/** The analysis bench. */
export class BenchPage {
  constructor(private readonly page: Page) {}

  private get contrast(): Locator {
    return this.page.getByRole('region', { name: 'Contrast' });
  }

  picker(name: Pick): Locator {
    return this.contrast.getByRole('button', { name: new RegExp(`^${name}:`) });
  }

  /** Picks a whole contrast; what is right already stays. */
  async pick(contrast: Contrast): Promise<void> {
    await this.pickOne('Outcome', contrast.outcome);
    if (contrast.outcomeColumn !== undefined) {
      await this.pickOne('Column of the outcome', contrast.outcomeColumn);
    }
    if (contrast.event !== undefined) await this.tick('What counts as the event', [contrast.event]);
    await this.pickOne('Exposure', contrast.exposure);
    await this.pickOne('Reference level', contrast.reference);
    if (contrast.strata !== undefined) await this.tick('Strata', contrast.strata);
  }

  async pickOne(name: Pick, choice: string): Promise<void> {
    await this.picker(name).click();
    await this.page.getByRole('menu').getByRole('menuitemradio', { name: choice }).first().click();
    await expect(this.page.getByRole('menu')).toHaveCount(0);
  }

  /** Ticks exactly these in a list of which several may hold. */
  async tick(name: Pick, choices: readonly string[]): Promise<void> {
    await this.picker(name).click();
    const items = this.page.getByRole('menu').getByRole('menuitemcheckbox');
    for (const item of await items.all()) {
      const label = (await item.innerText()).trim();
      const isOn = (await item.getAttribute('aria-checked')) === 'true';
      if (isOn !== choices.includes(label)) await item.click();
    }
    await this.page.keyboard.press('Escape');
    await expect(this.page.getByRole('menu')).toHaveCount(0);
  }

  /** A guard, by its title. */
  guard(title: string | RegExp): Locator {
    const guards = this.page.getByRole('complementary', { name: 'Guards and sentence' });
    return guards.getByRole('heading', { name: title }).locator('..');
  }

  /** A note below the pooled estimates. */
  pooledNote(text: string | RegExp): Locator {
    return this.page.getByRole('main').getByRole('paragraph').filter({ hasText: text });
  }

  /** The cells of a table of the bench, row by row. */
  async rowsOf(table: keyof typeof TABLES): Promise<readonly string[][]> {
    const rows = this.page.getByRole('table', { name: TABLES[table] }).getByRole('row');
    return rows.evaluateAll((all) =>
      all.map((row) =>
        [...row.children].map((cell) => cell.textContent.replace(/\s+/g, ' ').trim()),
      ),
    );
  }

  async save(name: string): Promise<void> {
    await this.page.getByRole('textbox', { name: 'Name', exact: true }).fill(name);
    await this.page.getByRole('banner').getByRole('button', { name: 'Save', exact: true }).click();
    await expect(this.useInReport).toBeVisible();
  }

  get useInReport(): Locator {
    return this.page.getByRole('banner').getByRole('button', { name: 'Use in a report' });
  }

  async reverse(): Promise<void> {
    await this.contrast.getByRole('button', { name: 'Reverse the contrast' }).click();
  }

  /** Puts table, figure and sentence of the analysis into a new report, and goes there. */
  async beginReport(title: string): Promise<void> {
    await this.useInReport.click();
    const dialog = this.page.getByRole('dialog');
    await dialog.getByLabel('Title').fill(title);
    await dialog.getByRole('button', { name: 'Use it there' }).click();
    await this.page.getByRole('heading', { level: 1, name: title }).waitFor();
  }
}
