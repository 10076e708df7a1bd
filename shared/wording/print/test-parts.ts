import type { AddressedQuantity, ResultScope } from '#shared/analysis';
import type { Result } from '#shared/core';
import { formatPValue, pValueStatement } from '#shared/format';
import type { EstimationIssue, TestOutcome } from '#shared/stats';
import { fillPattern, joinParts, type SlotFilling } from '../phrasebook/fill-pattern';
import type { PhrasePart } from '../phrase';
import { printAddress, type PrintContext } from './print-context';

/** One p-value of the analysis, with its place. */
export interface PlacedTest {
  readonly outcome: Result<TestOutcome, EstimationIssue>;
  readonly quantity: AddressedQuantity;
  readonly levelId: string | null;
  readonly scope: ResultScope;
  /** Where it stands, in words; null where that is plain. */
  readonly place: string | null;
}

/** "P=0.012", with the p-value bound. */
export function pValueParts(
  context: PrintContext,
  test: TestOutcome,
  at: Pick<PlacedTest, 'quantity' | 'levelId' | 'scope'>,
): readonly PhrasePart[] {
  const { style, result } = context;
  const pValue = formatPValue(test.pValue, result.specification.level, style);
  const { symbol, italic, relation } = pValueStatement(pValue, style);
  const place = { levelId: at.levelId, scope: at.scope };
  return joinParts([
    { kind: 'text', text: symbol, ...(italic ? { italic: true } : {}) },
    relation,
    {
      kind: 'value',
      text: pValue.figure,
      address: printAddress(context, at.quantity, place, 'pValue'),
    },
  ]);
}

/** "P<0.001 on hospital wards; P<0.001 in kitchens"; null where no test is defined. */
export function testList(
  context: PrintContext,
  tests: readonly PlacedTest[],
): readonly PhrasePart[] | null {
  const { book } = context;
  const said = tests.flatMap((test) => {
    if (!test.outcome.ok) {
      return [];
    }
    const parts = pValueParts(context, test.outcome.value, test);
    const { place } = test;
    return [place === null ? parts : fillPattern(book, 'note.testAt', { test: parts, place })];
  });
  const joined = said.flatMap<SlotFilling>((parts, place) =>
    place === 0 ? [parts] : [fillPattern(book, 'list.semicolon', {}), parts],
  );
  return said.length === 0 ? null : joinParts(joined);
}
