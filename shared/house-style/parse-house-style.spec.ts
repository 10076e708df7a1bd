import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parseHouseStyle } from './index';

const FOLDER = new URL('../../templates/house-styles/', import.meta.url);
const IDS = readdirSync(FOLDER);

type Json = Record<string, unknown>;

function readStyle(id: string): Json {
  return JSON.parse(readFileSync(new URL(`${id}/house-style.json`, FOLDER), 'utf8')) as Json;
}

function changed(path: string, value: unknown): Json {
  const style = readStyle('open-clinical');
  const names = path.split('.');
  const last = names.pop() ?? '';
  const place = names.reduce((part, name) => part[name] as Json, style);
  place[last] = value;
  return style;
}

function messageOf(json: unknown): unknown {
  const parsed = parseHouseStyle(json);
  return parsed.ok ? 'accepted' : parsed.issue.facts;
}

describe('the house styles of the application', () => {
  it('are these', () => {
    expect(IDS.toSorted()).toEqual([
      'bracketed-social-health',
      'compact-clinical',
      'open-clinical',
      'public-bulletin',
    ]);
  });

  it.each(IDS)('%s is read as it stands, under the id of its folder', (id) => {
    const parsed = parseHouseStyle(readStyle(id));
    expect(parsed).toEqual({ ok: true, value: readStyle(id) });
    expect(parsed.ok && parsed.value.id).toBe(id);
  });
});

describe('a house style that cannot be used', () => {
  it.each([
    ['percent.sign', 'sometimes', 'percent.sign must be one of "closed", "spaced", "word".'],
    ['pValue.italic', 'yes', 'pValue.italic must be true or false.'],
    ['ratio.decimals', 4, 'ratio.decimals must be one of 1, 2, 3.'],
    ['page.lineSpacing', 0.5, 'page.lineSpacing must be a number from 1 to 3.'],
    [
      'percent.countsOnlyBelow',
      2.5,
      'percent.countsOnlyBelow must be a whole number from 0 to 1000.',
    ],
    ['sentence.versus', ' ', 'sentence.versus must hold some text.'],
    ['effectiveDate', '2025-02-30', 'effectiveDate must be a day such as 2026-01-31.'],
    ['table.footnoteSymbols', [], 'table.footnoteSymbols must be a list with at least one entry.'],
    ['table.footnoteSymbols', ['*', 7], 'table.footnoteSymbols[1] must hold some text.'],
    ['caption', 'bold', 'caption must be an object.'],
    ['numbers.font', 'Arial', 'numbers.font is no setting of a house style.'],
    ['interval.joiner', undefined, 'interval.joiner is missing.'],
    [
      'percent.decimalsByDenominator',
      [{ from: 20, decimals: 1 }],
      'percent.decimalsByDenominator must start from 0 and rise from one step to the next.',
    ],
    [
      'pValue.decimals',
      [{ below: 0.2, decimals: 3 }],
      'pValue.decimals must rise from one step to the next and end at 1.',
    ],
  ])('%s: %j', (field, value, message) => {
    expect(messageOf(changed(field, value))).toMatchObject({ message });
  });

  it('is refused where two marks would look alike', () => {
    const style = changed('numbers', {
      rounding: 'halfUp',
      decimalMark: ',',
      thousands: { separator: 'comma', fromDigits: 4 },
    });
    expect(messageOf(style)).toEqual({
      field: 'numbers.thousands.separator',
      message: 'numbers.thousands.separator cannot be a comma where the decimal mark is one.',
    });
  });

  it('is refused where a double-width figure is narrower than a single one', () => {
    expect(messageOf(changed('figure.doubleWidthInMillimetres', 60))).toMatchObject({
      field: 'figure.doubleWidthInMillimetres',
    });
  });

  it.each([[null], [[]], ['text'], [7]])('is no %j', (json) => {
    expect(messageOf(json)).toEqual({ field: '', message: 'The house style must be an object.' });
  });
});
