import { expect, it } from 'vitest';
import { exported, inLines, partText } from '../exports/file-parts';
import { laidRequest } from '../exports/laid-report';

// What one of every element becomes. A change of these files is a change of every export: read it.

it.each(['word/document.xml', 'word/styles.xml', 'word/numbering.xml'])(
  'draws %s as before',
  async (path) => {
    const file = await exported('docx', laidRequest());
    await expect(inLines(partText(file, path))).toMatchFileSnapshot(golden(path));
  },
  60_000,
);

it.each(['xl/worksheets/sheet1.xml', 'xl/sharedStrings.xml', 'xl/styles.xml'])(
  'draws %s as before',
  async (path) => {
    const file = await exported('xlsx', laidRequest());
    await expect(inLines(partText(file, path))).toMatchFileSnapshot(golden(path));
  },
  60_000,
);

function golden(path: string): string {
  return `exports/${path.replaceAll('/', '-')}`;
}
