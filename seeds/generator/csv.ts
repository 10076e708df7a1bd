/** One line of a demonstration file. */
export type CsvRow = readonly (string | number)[];

/** A comma-separated file with a header line; values with a comma or a quote are quoted. */
export function csvText(header: readonly string[], rows: readonly CsvRow[]): string {
  return [header, ...rows].map((row) => row.map(quoted).join(',')).join('\n') + '\n';
}

function quoted(value: string | number): string {
  const text = String(value);
  return /[",\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
