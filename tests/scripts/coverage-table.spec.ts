import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { COMPARED, SIZES } from './coverage-grid';
import { COVERAGE_TOPIC, coverageRow } from './coverage-markdown';

const topic = readFileSync(COVERAGE_TOPIC, 'utf8');

/** The heavy methods take minutes at the largest size; the script computes those. */
const QUICK = { light: [10, 20], heavy: [10] } as const;

describe.each(COMPARED)('coverage of intervals: $title', (estimand) => {
  const rows = writtenRows(estimand.title);

  it('shows every method, in the order in which they are offered', () => {
    expect(rows.map(([label]) => label)).toEqual(estimand.methods.map(({ label }) => label));
  });

  it.each(estimand.methods)('$label: the written figures come again', (method) => {
    const sizes: readonly number[] = QUICK[method.effort];
    const written = rows.find(([label]) => label === method.label) ?? [];
    const [, ...computed] = coverageRow(estimand, method, sizes);
    const places = SIZES.map((size, at) => (sizes.includes(size) ? [1 + 2 * at, 2 + 2 * at] : []));
    expect(places.flat().map((place) => written[place])).toEqual(computed.slice(0, -1));
    expect(written.at(-1)?.split(', ').slice(0, sizes.length).join(', ')).toBe(computed.at(-1));
  });

  it('has exact methods that never fall below the level', () => {
    const exact = rows.filter(([label]) => /exact/i.test(label ?? ''));
    const least = exact.flatMap((cells) => cells.join(' ').match(/(?<=\()[\d.]+(?=\))/gu) ?? []);
    expect(least.every((figure) => Number(figure) >= 95)).toBe(true);
    expect(exact.length).toBeGreaterThan(0);
  });
});

/** The cells of an estimand's table, without its head. */
function writtenRows(title: string): readonly (readonly string[])[] {
  const [, after = ''] = topic.split(`### ${title}\n`);
  const [section = ''] = after.split('\n### ');
  const lines = section.split('\n').filter((line) => line.startsWith('|'));
  return lines.slice(2).map((line) =>
    line
      .split('|')
      .slice(1, -1)
      .map((cell) => cell.trim()),
  );
}
