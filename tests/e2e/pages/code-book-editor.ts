import { expect, type Locator, type Page } from '@playwright/test';

/** The editor of a code book, in a new cut and on a page of its own. */
export class CodeBookEditor {
  constructor(private readonly page: Page) {}

  /** Shows a column, by its name in the file. */
  async show(column: string): Promise<void> {
    const main = this.page.getByRole('main');
    await main
      .getByRole('button')
      .filter({ has: exactCode(this.page, column) })
      .click();
  }

  field(label: string): Locator {
    return this.page.getByRole('main').getByLabel(label, { exact: true });
  }

  /** Words of the column in view. */
  async word(words: { readonly table?: string; readonly sentence?: string }): Promise<void> {
    if (words.table !== undefined) await this.field('Name in tables').fill(words.table);
    if (words.sentence !== undefined) await this.field('Name in sentences').fill(words.sentence);
  }

  async setKind(kind: string): Promise<void> {
    await this.field('Kind').selectOption({ label: kind });
  }

  /** How people at a level, and those within it, are spoken of. */
  async setPatterns(people: string, within?: string): Promise<void> {
    await this.field('People at a level').fill(people);
    if (within !== undefined) await this.field('Within a stratum').fill(within);
  }

  async wordLevel(inFile: string, table: string, sentence = table): Promise<void> {
    await this.field(`Label for ${inFile}`).fill(table);
    await this.field(`Words for ${inFile} in sentences`).fill(sentence);
  }

  async makeReference(label: string): Promise<void> {
    await this.page.getByRole('radio', { name: `Make ${label} the reference` }).check();
  }

  /** The levels in their order, as the file has them. */
  async levelsInFile(): Promise<readonly string[]> {
    const levels = this.page.getByRole('main').getByRole('list', { name: /^Levels of / });
    return levels.getByRole('code').allTextContents();
  }

  /** Puts the levels into this order by the menus beside them. */
  async order(labels: readonly string[]): Promise<void> {
    for (const [place, label] of labels.entries()) {
      await this.moveTo(label, place, labels.length);
    }
  }

  async merge(...labels: readonly string[]): Promise<void> {
    for (const label of labels) {
      await this.page.getByRole('checkbox', { name: `Pick ${label} to merge` }).check();
    }
    await this.page.getByRole('button', { name: `Merge ${labels.length} levels` }).click();
  }

  /** Names the levels in their order; sentences begin them with a small letter. */
  async nameLevels(...labels: readonly string[]): Promise<void> {
    const levels = this.page.getByRole('main').getByRole('list', { name: /^Levels of / });
    for (const [place, label] of labels.entries()) {
      const level = levels.getByRole('listitem').nth(place);
      await level.getByLabel(/^Label for /).fill(label);
      await level.getByLabel(/ in sentences$/).fill(label.charAt(0).toLowerCase() + label.slice(1));
    }
  }

  private async moveTo(label: string, place: number, count: number): Promise<void> {
    for (let turn = 0; turn < count; turn += 1) {
      const menu = this.page.getByRole('button', { name: /^What to do with / });
      const names = await menu.evaluateAll((buttons) =>
        buttons.map((button) => button.getAttribute('aria-label') ?? ''),
      );
      if (names[place] === `What to do with ${label}`) return;
      await this.page
        .getByRole('button', { name: `What to do with ${label}`, exact: true })
        .click();
      await this.page.getByRole('menuitem', { name: 'Move up' }).click();
      await expect(this.page.getByRole('menu')).toHaveCount(0);
    }
    throw new Error(`${label} did not come to place ${place + 1}.`);
  }
}

function exactCode(page: Page, text: string): Locator {
  return page.getByRole('code').getByText(text, { exact: true });
}
