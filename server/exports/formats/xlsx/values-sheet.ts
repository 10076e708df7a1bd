import { addressKey, numberOf } from '#shared/analysis';
import type { AddressedValue, ValueAddress } from '#shared/analysis';
import type { PinnedAnalysis } from '#shared/report';
import { pinValues, valueWords } from '#shared/report';
import type { Phrasebook } from '#shared/wording';
import {
  cellsRow,
  lookingLike,
  numberCell,
  words,
  type SheetPlan,
  type SheetRow,
} from './sheet-plan';

/**
 * Every value of every analysis that the report pins, at full precision, with its address;
 * estimates from elsewhere as precisely as they were entered.
 */
export function valuesSheet(pins: readonly PinnedAnalysis[], phrasebook: Phrasebook): SheetPlan {
  return {
    name: 'Values',
    rows: [
      cellsRow(
        lookingLike(
          HEADS.map(([text, align]) => words(text, { align })),
          HEAD_LOOK,
        ),
      ),
      ...pins.flatMap((pin) => analysisRows(pin, phrasebook)),
    ],
    widestColumn: 220,
    headRows: { first: 1, last: 1 },
    frozenColumns: 0,
    filtered: true,
  };
}

const HEADS = [
  ['Analysis', 'start'],
  ['Name', 'start'],
  ['Data cut', 'center'],
  ['Data date', 'start'],
  ['Quantity', 'start'],
  ['Group', 'start'],
  ['Where', 'start'],
  ['Value', 'end'],
  ['Exact fraction', 'end'],
  ['Scale', 'start'],
  ['Address', 'start'],
] as const;

const HEAD_LOOK = { bold: true, bottom: 'thin' } as const;

function analysisRows(pin: PinnedAnalysis, phrasebook: Phrasebook): readonly SheetRow[] {
  return pinValues(pin).map((value) => valueRow(value, pin, phrasebook));
}

function valueRow(
  { address, quantity }: AddressedValue,
  pin: PinnedAnalysis,
  phrasebook: Phrasebook,
): SheetRow {
  const { what, whom, where } = valueWords(address, pin, phrasebook);
  const fraction =
    quantity.kind === 'fraction'
      ? `${String(quantity.numerator)}/${String(quantity.denominator)}`
      : '';
  return cellsRow([
    words(pin.number),
    words(pin.name),
    numberCell(pin.cut.number, '0', { align: 'center' }),
    words(pin.cut.dataDate),
    words(what),
    words(whom),
    words(where),
    numberCell(numberOf(quantity), 'General'),
    words(fraction, { align: 'end' }),
    words(scaleWords(address, pin)),
    words(addressKey(address)),
  ]);
}

/** What a number counts, so that nobody takes a share for a percentage. */
function scaleWords({ quantity, facet, estimateId }: ValueAddress, pin: PinnedAnalysis): string {
  if (facet === 'pValue') return 'probability, 0 to 1';
  if (facet === 'statistic') return 'test statistic';
  if (COUNTS.includes(quantity)) return 'count';
  const outside = pin.outside?.find(({ id }) => id === estimateId);
  const measure = outside?.measure ?? quantity;
  if (measure === 'riskDifference') return 'difference of shares, −1 to 1';
  if (RATIOS.includes(measure)) return 'ratio';
  return quantity === 'numberNeeded' ? 'people' : 'share, 0 to 1';
}

const RATIOS: readonly string[] = ['riskRatio', 'oddsRatio', 'rateRatio', 'hazardRatio'];

const COUNTS: readonly ValueAddress['quantity'][] = [
  'events',
  'total',
  'counted',
  'leftOut',
  'controls',
  'comparedCases',
  'comparedControls',
];
