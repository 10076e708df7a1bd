import { readFile } from 'node:fs/promises';
import { expect, type Locator, type Page } from '@playwright/test';
import { readProof, type PrintedBlock } from '../readers/proof';

/** What leads in the effects of a report. */
export type Framing = 'Absolute' | 'Both' | 'Relative';

/** A kind of block, as the menu offers it. */
export type BlockName =
  'Heading' | 'Prose' | 'Stratified table' | 'Grouped bar chart' | 'Effect sentence';

/** The report workspace. */
export class ReportPage {
  constructor(private readonly page: Page) {}

  /** A block, by its name: "Table 1", "Effect sentence". */
  block(name: string, place = 0): Locator {
    return this.page.getByRole('group', { name, exact: true }).nth(place);
  }

  /** Every block that prints, in order. */
  async printed(): Promise<readonly PrintedBlock[]> {
    return readProof(this.page);
  }

  /** Waits until all that was done is stored. */
  async untilSaved(): Promise<void> {
    await expect(this.page.getByRole('banner').getByText(/Saved/)).toBeVisible();
  }

  rail(): Locator {
    return this.page.getByRole('banner').getByRole('group', { name: 'The whole report says' });
  }

  async say(framing: Framing): Promise<void> {
    await this.rail().getByText(framing, { exact: true }).click();
    await expect(this.rail().getByRole('radio', { name: framing })).toBeChecked();
  }

  /** Takes a block in hand. */
  async takeInHand(block: Locator): Promise<void> {
    await block.focus();
  }

  /** Adds a block after another and opens it; `analysis` is chosen where the study has several. */
  async add(kind: BlockName, after: string, place = 0): Promise<void> {
    await this.block(after, place).hover();
    await this.block(after, place)
      .getByRole('button', { name: /^Add a block after / })
      .click();
    await this.page.getByRole('menuitem', { name: kind }).click();
  }

  /** Adds an effect sentence of the only analysis behind a block, about these records. */
  async addSentence(after: string, whom: string): Promise<void> {
    await this.add('Effect sentence', after);
    await this.page.getByLabel('In whom').selectOption({ label: whom });
    await this.leaveBlock();
  }

  /** Adds prose behind a block: words, then a bound value that a search finds. */
  async addWords(after: string, words: string, search: string, print: string): Promise<void> {
    await this.add('Prose', after);
    await expect(this.words).toBeFocused();
    await this.page.keyboard.type(words);
    await this.insertValue(search, print);
    await this.page.keyboard.type(' is bound.');
    await this.leaveBlock();
  }

  /** The open editor of words. */
  get words(): Locator {
    return this.page.getByRole('main').getByRole('textbox', { name: 'Text', exact: true });
  }

  /** Binds the value that prints so at the cursor; a search in words finds it. */
  async insertValue(search: string, print: string): Promise<void> {
    await this.page.getByRole('button', { name: 'Insert value' }).click();
    const dialog = this.page.getByRole('dialog', { name: 'Which value?' });
    await dialog.getByRole('searchbox').fill(search);
    const values = dialog.getByRole('list', { name: 'Values' });
    await values.getByRole('button', { name: print }).first().click();
    await dialog.getByRole('button', { name: 'Insert the value' }).click();
    await dialog.waitFor({ state: 'hidden' });
  }

  /** Opens the words of a block. */
  async openWords(block: Locator): Promise<void> {
    await this.takeInHand(block);
    await this.page.keyboard.press('Enter');
    await expect(this.words).toBeFocused();
  }

  /** Closes the open block; it stays in hand. */
  async leaveBlock(): Promise<void> {
    await this.page.keyboard.press('Escape');
    await expect(this.blockWithFocus).toBeVisible();
  }

  /** The block that has the focus itself. */
  get blockWithFocus(): Locator {
    return this.page.getByRole('main').getByRole('group').and(this.page.locator(':focus'));
  }

  /** A check beside the proof, by its subject. */
  check(subject: string | RegExp): Locator {
    return this.page.getByRole('note').filter({
      has: this.page.getByRole('heading', { name: subject }),
    });
  }

  /** Turns the contrast of a block round, with a reason. */
  async reverse(block: Locator, reason: string, reference?: string): Promise<void> {
    await this.takeInHand(block);
    await this.page.keyboard.press('x');
    const dialog = this.page.getByRole('dialog');
    if (reference !== undefined) {
      await dialog.getByLabel('New reference').selectOption({ label: reference });
    }
    await dialog.getByLabel('Reason').fill(reason);
    await dialog.getByRole('button', { name: 'Reverse the contrast' }).click();
    await dialog.waitFor({ state: 'hidden' });
  }

  /** Downloads the draft as it stands. */
  async download(format: 'DOCX' | 'XLSX'): Promise<Uint8Array> {
    await this.page.getByRole('banner').getByRole('button', { name: 'Download' }).click();
    const started = this.page.waitForEvent('download', { timeout: 60_000 });
    await this.page.getByRole('menuitem', { name: format }).click();
    const download = await started;
    expect(download.suggestedFilename()).toMatch(new RegExp(`\\.${format.toLowerCase()}$`));
    return readFile(await download.path());
  }
}
