import type { Records, RecordsWindow } from './counting-engine';
import type { ResidentCuts } from './resident-cuts';

/** Reads a window of a cut's rows, as they stood in the file. */
export async function readRecords(
  resident: ResidentCuts,
  cutId: string,
  { offset, limit }: RecordsWindow,
): Promise<Records> {
  const outline = await resident.outline(cutId);
  const length = Math.max(0, Math.min(limit, outline.rows - offset));
  const rows: string[][] = Array.from({ length }, () => []);
  for (const column of outline.columns) {
    const { codes, dictionary } = await resident.column(outline, column);
    rows.forEach((row, at) => {
      row.push(dictionary[codes[offset + at] ?? 0] ?? '');
    });
  }
  return { columns: outline.columns.map(({ name }) => name), rows, total: outline.rows };
}
