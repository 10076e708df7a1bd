import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { addressKey } from '#shared/analysis';
import type { AnalysisResult } from '#shared/analysis';
import type { ComposedReport, LayoutElement } from '#shared/layout';
import { valueLedger } from '#shared/report';
import { balanceOf, claimOf } from '#shared/wording';
import { seed } from '../../seeds/seed';
import { composeStoredReport } from '../../server/services/reports/compose-stored-report';
import { houseStyle, phrasebook } from '../builders/house-styles';
import { blockOf, composed, pinned, reportOf, textOf } from '../builders/reports';
import { startTestApplication, type TestApplication } from '../builders/test-application';
import {
  BALANCE_TRAINING,
  LIFTING,
  NIGHT_WORK,
  REMINDERS,
  SCREENS,
  twoGroups,
  type TwoGroups,
} from '../wording/two-group-scenarios';
import displayed from './displayed-strings.json';

type Strings = Readonly<Record<string, string>>;

interface Displayed {
  readonly name: string;
  readonly style: 'open-clinical' | 'compact-clinical';
  readonly printed: Strings;
  readonly needed?: readonly string[];
}

const cases = displayed.cases.filter(({ kind }) => kind === 'table') as unknown as readonly Displayed[];

const EXAMPLES: Readonly<Record<string, TwoGroups>> = {
  'night work': NIGHT_WORK,
  'balance training': BALANCE_TRAINING,
  lifting: LIFTING,
  screens: SCREENS,
  reminders: REMINDERS,
};

describe('the standing examples print what R prints', () => {
  const examples = cases.filter(({ name }) => name in EXAMPLES);
  const resultOf = (name: string): AnalysisResult => twoGroups(EXAMPLES[name]!);

  it.each(examples)('$name, $style', ({ name, style, printed }) => {
    const pin = pinned(resultOf(name));
    const blocks = [
      blockOf('table', 'stratifiedTable', pin, { pValues: 'unadjusted' }),
      blockOf('sentence', 'effectSentence', pin),
    ];
    const report = composed(reportOf(blocks, [pin]), [pin], houseStyle(style));
    const found = stringsOf(report).map(({ key, text }) => [key.replace('a1/', ''), text]);
    expectPrinted(found as [string, string][], printed, 7);
  });

  it.each(examples.filter(({ needed }) => needed))('number needed: $name, $style', (one) => {
    const contrast = { analysisId: 'a1', indexLevelId: 'index', scope: { kind: 'crude' } } as const;
    const claim = claimOf(resultOf(one.name), contrast);
    if (!claim.ok) throw new Error(JSON.stringify(claim.issue));
    const { absolute } = balanceOf(claim.value, houseStyle(one.style), phrasebook());
    const text = absolute.available ? (absolute.secondText ?? '') : '';
    const numbers = text.replace(/^1\s/, '').match(/\d+/g);
    expect(numbers).toEqual(one.needed);
  });
});

describe('the demonstration reports print what R prints from the same files', () => {
  let application: TestApplication;
  let numbers: ReadonlyMap<string, readonly [string, string][]>;

  beforeAll(async () => {
    application = await startTestApplication();
    await seed(application.dependencies, () => undefined);
    numbers = await printedByAnalysis(application);
  }, 120_000);

  afterAll(async () => {
    await application.close();
  });

  const demonstrations = cases.filter(({ name }) => !(name in EXAMPLES));

  it('are the ones with cases', () => {
    const names = demonstrations.map(({ name }) => name);
    expect([...numbers.keys()].toSorted()).toEqual(names.toSorted());
  });

  it.each(demonstrations)('$name', ({ name, printed }) => {
    expectPrinted(numbers.get(name) ?? [], printed, 7);
  });
});

/** The numbers of all seeded reports, by the name of their analysis. */
async function printedByAnalysis({
  dependencies,
}: TestApplication): Promise<ReadonlyMap<string, readonly [string, string][]>> {
  const [rows] = await dependencies.database.sequelize.query('SELECT id, study_id FROM reports');
  const byName = new Map<string, [string, string][]>();
  for (const row of rows as readonly { id: string; study_id: string }[]) {
    const outcome = await composeStoredReport(dependencies, row.study_id, row.id);
    if (!outcome.ok) throw new Error(JSON.stringify(outcome.issue));
    const { pins, composed: report } = outcome.value;
    for (const { key, text } of stringsOf(report)) {
      const [analysisId, ...rest] = key.split('/');
      const name = pins.find((pin) => pin.analysisId === analysisId)?.name ?? '';
      byName.set(name, [...(byName.get(name) ?? []), [rest.join('/'), text]]);
    }
  }
  return byName;
}

/** What is printed of each number, in tables, sentences and figures, and in whole cells. */
function stringsOf(report: ComposedReport): readonly { key: string; text: string }[] {
  const numbers = valueLedger(report).map(({ address, text }) => ({
    key: addressKey(address),
    text,
  }));
  return [...numbers, ...report.elements.flatMap(cellsOf)];
}

/** The whole text of the cells of an estimate with its limits, and of those of a p-value. */
function cellsOf(element: LayoutElement): readonly { key: string; text: string }[] {
  const cells = element.kind === 'table' ? element.rows.flatMap((row) => row.cells) : [];
  return cells.flatMap(({ numbers, runs }) => {
    const [first, ...limits] = numbers.filter((number) => number !== null);
    const isP = limits.length === 0 && first?.address.facet === 'pValue';
    if (first === undefined || (limits.length !== 2 && !isP)) return [];
    const key = addressKey(first.address).replace(/\/(value|pValue)$/, '/cell');
    return [{ key, text: textOf(runs) }];
  });
}

/** Numbers that a table of counts alone does not give, or that words turn round. */
const APART = /^(leftOut|outsideEstimate|numberNeeded)/;

/** Every printed number is R's, and there are enough of them for this to mean something. */
function expectPrinted(
  found: readonly (readonly [key: string, text: string])[],
  printed: Strings,
  fewest: number,
): void {
  const checked = found.filter(([key, text]) => !APART.test(key) && !isRelativeChange(key, text));
  expect(checked.length).toBeGreaterThanOrEqual(fewest);
  for (const [key, text] of checked) {
    const wanted = printed[key] ?? 'nothing';
    expect(alike(text, text, key), key).toBe(alike(wanted, text, key));
  }
}

/** "19%" in a sentence stands for a ratio of 1.19, which follows it. */
function isRelativeChange(key: string, text: string): boolean {
  return /^(riskRatio|oddsRatio)\//.test(key) && text.endsWith('%');
}

/**
 * Plain characters; and where the words around a number carry its sign, or the point of a p-value,
 * without them. `shown` is what our page prints.
 */
function alike(text: string, shown: string, key: string): string {
  const plain = text.replaceAll(/[\u2212\u2013]/g, '-').replaceAll(/[\u00a0\u202f]/g, ' ').replace('%', '');
  if (key.endsWith('/pValue')) return plain.replace(/^[<>=]?0?\./, '');
  return /^[+\u2212]/.test(shown) ? plain : plain.replace(/^[+-]/, '');
}
