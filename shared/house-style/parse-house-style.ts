import { success, type Result } from '#shared/core';
import {
  day,
  listOf,
  numberBetween,
  oneOf,
  orNull,
  recordOf,
  refuse,
  wholeBetween,
  words,
  yesOrNo,
  type FieldReader,
  type HouseStyleIssue,
} from './field-readers';
import type {
  CaptionStyle,
  DenominatorStep,
  FigureStyle,
  HouseStyle,
  IntervalStyle,
  NumberStyle,
  PageStyle,
  PercentStyle,
  PValueStyle,
  SentenceStyle,
  TableStyle,
} from './house-style';

/**
 * Reads a house style from parsed JSON.
 *
 * Every setting must be there and have one of its values; settings that contradict each other are
 * refused. The issue names the first field that is wrong, and why, in plain words.
 */
export function parseHouseStyle(json: unknown): Result<HouseStyle, HouseStyleIssue> {
  const read = HOUSE_STYLE(json, '');
  return read.ok ? withoutContradictions(read.value) : read;
}

const NUMBERS = recordOf<NumberStyle>({
  rounding: oneOf('halfUp', 'halfEven'),
  decimalMark: oneOf('.', '·', ','),
  thousands: recordOf<NumberStyle['thousands']>({
    separator: oneOf('none', 'narrowSpace', 'comma'),
    fromDigits: oneOf(4, 5),
  }),
});

const PERCENT = recordOf<PercentStyle>({
  sign: oneOf('closed', 'spaced', 'word'),
  word: words(),
  decimalsByDenominator: listOf(
    recordOf<DenominatorStep>({ from: wholeBetween(0, 1e9), decimals: oneOf(0, 1, 2) }),
    startsAtZeroAndRises,
  ),
  oneMoreDecimalBelow: orNull(numberBetween(0, 100)),
  countsOnlyBelow: wholeBetween(0, 1000),
  mixedDenominators: oneOf('majority', 'smallest'),
});

const INTERVAL = recordOf<IntervalStyle>({
  label: oneOf('abbreviated', 'spelled'),
  afterLabel: oneOf(' ', ', '),
  separator: oneOf('to', 'enDash', 'comma'),
  sentenceBrackets: oneOf('none', 'square'),
  tableBrackets: oneOf('round', 'square'),
  joiner: oneOf('; ', ', '),
});

const P_VALUE = recordOf<PValueStyle>({
  symbol: oneOf('P', 'p'),
  italic: yesOrNo,
  leadingZero: yesOrNo,
  spacing: oneOf('spaced', 'closed'),
  floor: numberBetween(1e-9, 0.05),
  ceiling: numberBetween(0.5, 0.9999),
  decimals: listOf(
    recordOf<PValueStyle['decimals'][number]>({
      below: numberBetween(0, 1),
      decimals: wholeBetween(1, 6),
    }),
    risesToOne,
  ),
});

const SENTENCE = recordOf<SentenceStyle>({
  groupCount: oneOf('nOfN', 'slash'),
  measureNames: oneOf('spelled', 'abbreviated'),
  measureJoiner: oneOf(' ', ', ', ' = '),
  versus: words(),
  pValue: oneOf('omitted', 'last'),
  numberNeeded: oneOf('byDirection', 'plain', 'never'),
});

const TABLE = recordOf<TableStyle>({
  referenceRatio: words(),
  referenceDifference: words(),
  missingCell: recordOf<TableStyle['missingCell']>({ mark: words(), meaning: words() }),
  footnoteMarkers: oneOf('letters', 'symbols', 'numbers'),
  footnoteSymbols: listOf(words()),
  superscriptMarkers: yesOrNo,
  abbreviations: oneOf('first', 'last'),
  notesLead: words('mayBeEmpty'),
});

const CAPTION = recordOf<CaptionStyle>({
  boldLabel: yesOrNo,
  afterNumber: words('mayBeEmpty'),
  lines: oneOf('one', 'two'),
  italicTitle: yesOrNo,
  figurePlace: oneOf('above', 'below'),
});

const PAGE = recordOf<PageStyle>({
  paper: oneOf('A4', 'letter'),
  marginInMillimetres: numberBetween(5, 60),
  bodyFont: words(),
  bodySizeInPoints: numberBetween(6, 24),
  lineSpacing: numberBetween(1, 3),
  headingFont: words(),
  tableFont: words(),
  tableSizeInPoints: numberBetween(6, 24),
  lineNumbers: yesOrNo,
});

const FIGURE = recordOf<FigureStyle>({
  singleWidthInMillimetres: numberBetween(40, 300),
  doubleWidthInMillimetres: numberBetween(40, 300),
  dotsPerInch: wholeBetween(72, 1200),
  font: words(),
  sizeInPoints: numberBetween(6, 24),
  lineInPoints: numberBetween(0.25, 4),
});

const HOUSE_STYLE: FieldReader<HouseStyle> = recordOf<HouseStyle>({
  schemaVersion: oneOf(1),
  id: words(),
  name: words(),
  effectiveDate: day,
  sourceNote: words(),
  language: oneOf('en-GB', 'en-US'),
  numbers: NUMBERS,
  percent: PERCENT,
  difference: recordOf<HouseStyle['difference']>({
    unit: oneOf('percentagePoints', 'per100', 'per1000', 'per10000'),
  }),
  ratio: recordOf<HouseStyle['ratio']>({ decimals: oneOf(1, 2, 3) }),
  interval: INTERVAL,
  pValue: P_VALUE,
  sentence: SENTENCE,
  table: TABLE,
  caption: CAPTION,
  page: PAGE,
  figure: FIGURE,
});

function startsAtZeroAndRises(steps: readonly DenominatorStep[]): string | null {
  const starts = steps.map(({ from }) => from);
  const rises = starts.every((from, place) => place === 0 || from > (starts[place - 1] ?? 0));
  return starts[0] === 0 && rises ? null : 'must start from 0 and rise from one step to the next';
}

function risesToOne(steps: PValueStyle['decimals']): string | null {
  const ends = steps.map(({ below }) => below);
  const rises = ends.every((below, place) => place === 0 || below > (ends[place - 1] ?? 0));
  return rises && ends.at(-1) === 1 ? null : 'must rise from one step to the next and end at 1';
}

/** Two marks that look alike would make a number unreadable. */
function withoutContradictions(style: HouseStyle): Result<HouseStyle, HouseStyleIssue> {
  const { decimalMark, thousands } = style.numbers;
  if (decimalMark === ',' && thousands.separator === 'comma') {
    return refuse('numbers.thousands.separator', 'cannot be a comma where the decimal mark is one');
  }
  if (style.figure.doubleWidthInMillimetres < style.figure.singleWidthInMillimetres) {
    return refuse('figure.doubleWidthInMillimetres', 'cannot be less than the single width');
  }
  return success(style);
}
