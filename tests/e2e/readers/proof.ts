import type { Page } from '@playwright/test';

/** What a table prints: the words of its cells, row by row; empty cells are left out. */
export interface PrintedTable {
  readonly caption: string;
  readonly head: readonly (readonly string[])[];
  readonly rows: readonly (readonly string[])[];
  readonly notes: readonly string[];
}

/** What a figure prints. */
export interface PrintedFigure {
  readonly caption: string;
  readonly altText: string;
  /** Every text in the drawing. */
  readonly texts: readonly string[];
  /** The numbers behind it, as the page shows them for reading. */
  readonly rows: readonly (readonly string[])[];
  readonly notes: readonly string[];
}

/** A block as the proof prints it. */
export interface PrintedBlock {
  /** As the block is called: "Table 1", "Effect sentence". */
  readonly name: string;
  readonly paragraphs: readonly string[];
  readonly tables: readonly PrintedTable[];
  readonly figures: readonly PrintedFigure[];
}

/** Reads what the proof of a report prints, from the page alone; waits for its drawings. */
export async function readProof(page: Page): Promise<readonly PrintedBlock[]> {
  const blocks: PrintedBlock[] = [];
  for (const block of await page.locator('eh-proof-block').all()) {
    for (const figure of await block.getByRole('figure').all()) {
      await figure.scrollIntoViewIfNeeded();
      await figure.getByRole('img', { name: 'chart' }).locator('svg').first().waitFor();
    }
    blocks.push(await block.evaluate(readBlock));
  }
  return blocks;
}

/** Runs in the page, so that it holds all that it needs. */
function readBlock(block: Element): PrintedBlock {
  const words = (element: Element | null): string =>
    (element?.textContent ?? '').replace(/[\s\u00a0\u2002]+/g, ' ').trim();
  const all = (root: ParentNode, selector: string): Element[] => [
    ...root.querySelectorAll(selector),
  ];
  const filled = (rows: Element[]): string[][] =>
    rows.map((row) => [...row.children].map(words).filter((text) => text !== ''));
  const printed = all(block, 'eh-proof-element');
  const inFigure = (element: Element): boolean => element.closest('figure') !== null;
  const tables = printed.flatMap((element) =>
    all(element, 'table')
      .filter((table) => !inFigure(table))
      .map((table) => ({
        caption: words(table.querySelector('caption')),
        head: filled(all(table, 'thead tr')),
        rows: filled(all(table, 'tbody tr')),
        notes: all(table, 'tfoot tr').map(words),
      })),
  );
  const figures = printed.flatMap((element) =>
    all(element, 'figure').map((figure) => ({
      caption: words(figure.querySelector('figcaption')),
      altText: figure.querySelector('.chart')?.getAttribute('aria-label') ?? '',
      texts: all(figure, '[role=img] svg text')
        .map(words)
        .filter((text) => text !== ''),
      rows: filled(all(figure, 'details tbody tr')),
      notes: all(figure, 'p')
        .filter((note) => note.closest('details') === null)
        .map(words),
    })),
  );
  const paragraphs = printed.flatMap((element) =>
    all(element, 'p, h2, h3, h4, li')
      .filter((each) => !inFigure(each) && each.closest('table') === null)
      .map(words),
  );
  return { name: block.getAttribute('aria-label') ?? '', paragraphs, tables, figures };
}
