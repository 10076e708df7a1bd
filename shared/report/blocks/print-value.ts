import { numberOf, readValue } from '#shared/analysis';
import type { AnalysisResult, AddressedQuantity, Quantity, ValueAddress } from '#shared/analysis';
import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { formatCount, formatNumber, formatPValue, pValueStatement } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { issueWords } from '#shared/wording';
import type { Phrasebook } from '#shared/wording';
import type { BoundPart } from '../text/bound-text';
import type { BoundValueFormat } from '../text/text-document';
import { printDifference, printFraction, printRatio, printShare } from './print-estimate';

/** A value as it is read: its place, its number, and what it prints under. */
export interface ReadValue {
  readonly result: AnalysisResult;
  readonly address: ValueAddress;
  readonly quantity: Quantity;
  readonly houseStyle: HouseStyle;
  readonly phrasebook: Phrasebook;
}

/** What stands on the page, in pieces with the addresses of their numbers. */
export type PrintedValue = readonly BoundPart[];

/**
 * Prints the value at an address in running text. A format that a quantity doesn't have reads as
 * `auto`. The issue is in words: the result has no such place.
 */
export function printValue(
  result: AnalysisResult,
  address: ValueAddress,
  format: BoundValueFormat,
  under: Pick<ReadValue, 'houseStyle' | 'phrasebook'>,
): Result<PrintedValue, string> {
  const read = readValue(result, address);
  const { houseStyle, phrasebook } = under;
  const kind = address.quantity;
  if (kind === 'outsideEstimate') {
    return failure(issueWords({ code: 'addressNotInResult' }, phrasebook));
  }
  if (read.ok) {
    const value = { result, address, quantity: read.value, houseStyle, phrasebook };
    return success(PRINTERS[kind](value, format));
  }
  if (read.issue.code === 'addressNotInResult') return failure(issueWords(read.issue, phrasebook));
  const text = read.issue.code === 'infinite' ? '∞' : houseStyle.table.missingCell.meaning;
  return success([{ text, addresses: [address] }]);
}

/** What a result holds; estimates from elsewhere stand beside it. */
type ResultQuantity = Exclude<AddressedQuantity, 'outsideEstimate'>;

type Printer = (value: ReadValue, format: BoundValueFormat) => PrintedValue;

const PRINTERS: Readonly<Record<ResultQuantity, Printer>> = {
  events: printCount,
  total: printCount,
  risk: printShare,
  riskDifference: printDifference,
  riskRatio: (value, format) => printRatio('riskRatio', value, format),
  oddsRatio: (value, format) => printRatio('oddsRatio', value, format),
  numberNeeded: printCount,
  test: printTest,
  pearson: printTest,
  fisher: printTest,
  association: printTest,
  trend: printTest,
  conditionalIndependence: printTest,
  'homogeneity:riskDifference': printTest,
  'homogeneity:riskRatio': printTest,
  'homogeneity:oddsRatio': printTest,
  'interaction:riskDifference': orTest(printDifference),
  'interaction:riskRatio': orTest((value, format) => printRatio('riskRatio', value, format)),
  'interaction:oddsRatio': orTest((value, format) => printRatio('oddsRatio', value, format)),
  excessRisk: orTest((value, format) => printRatio('riskRatio', value, format)),
  fractionInExposed: printFraction,
  populationFraction: printFraction,
  eValue: (value, format) => printRatio('riskRatio', value, format),
  counted: printCount,
  leftOut: printCount,
  controls: printCount,
  shareOfCases: printShare,
  shareOfControls: printShare,
  comparedCases: printCount,
  comparedControls: printCount,
  shareOfComparedCases: printShare,
  shareOfComparedControls: printShare,
};

/** A number with a test of its own: the test's facets print as a test does. */
function orTest(printer: Printer): Printer {
  return (value, format) =>
    value.address.facet === 'pValue' || value.address.facet === 'statistic'
      ? printTest(value)
      : printer(value, format);
}

function printCount({ address, quantity, houseStyle }: ReadValue): PrintedValue {
  return [{ text: formatCount(numberOf(quantity), houseStyle).text, addresses: [address] }];
}

function printTest({ result, address, quantity, houseStyle }: ReadValue): PrintedValue {
  if (address.facet === 'statistic') return printStatistic(address, quantity, houseStyle);
  const pValue = formatPValue(numberOf(quantity), result.specification.level, houseStyle);
  const { symbol, relation } = pValueStatement(pValue, houseStyle);
  return [
    { text: symbol + relation, addresses: [] },
    { text: pValue.figure, addresses: [address] },
  ];
}

function printStatistic(
  address: ValueAddress,
  quantity: Quantity,
  style: HouseStyle,
): PrintedValue {
  const form = { scale: 1, decimals: 2, sign: 'minus' } as const;
  return [{ text: formatNumber(quantity, form, style).text, addresses: [address] }];
}
