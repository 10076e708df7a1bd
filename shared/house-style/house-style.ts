/** How numbers are written: rounding, decimal mark, grouping of thousands. */
export interface NumberStyle {
  /** Ties: away from zero (`halfUp`) or to the even digit (`halfEven`). */
  readonly rounding: 'halfUp' | 'halfEven';
  readonly decimalMark: '.' | '·' | ',';
  readonly thousands: {
    readonly separator: 'none' | 'narrowSpace' | 'comma';
    /** Fewest digits of a whole number that is grouped. */
    readonly fromDigits: 4 | 5;
  };
}

/** Decimals for denominators of `from` and more, up to the next step. */
export interface DenominatorStep {
  readonly from: number;
  readonly decimals: 0 | 1 | 2;
}

/** How shares of people are written as percentages. */
export interface PercentStyle {
  /** "12.5%", "12.5 %" with a no-break space, or the number and `word`. */
  readonly sign: 'closed' | 'spaced' | 'word';
  readonly word: string;
  readonly decimalsByDenominator: readonly DenominatorStep[];
  /** An analysis with a share below this many percent gets one more decimal; null never does. */
  readonly oneMoreDecimalBelow: number | null;
  /** Groups smaller than this show counts only; 0 shows every percentage. */
  readonly countsOnlyBelow: number;
  /** What decides for an analysis whose groups ask for different decimals. */
  readonly mixedDenominators: 'majority' | 'smallest';
}

/** The unit of an absolute change. */
export type DifferenceUnit = 'percentagePoints' | 'per100' | 'per1000' | 'per10000';

/** How confidence limits are introduced, separated and bracketed. */
export interface IntervalStyle {
  /** "95% CI" or "95% confidence interval". */
  readonly label: 'abbreviated' | 'spelled';
  /** Between label and limits: "95% CI 1.1", "95% CI, 1.1". */
  readonly afterLabel: ' ' | ', ';
  /** Becomes "to" beside a minus sign, and a semicolon where a comma is the decimal mark. */
  readonly separator: 'to' | 'enDash' | 'comma';
  /** Round the limits in sentences. */
  readonly sentenceBrackets: 'none' | 'square';
  /** Round the limits behind an estimate in a table cell. */
  readonly tableBrackets: 'round' | 'square';
  /** Between several statistics in one pair of brackets. */
  readonly joiner: '; ' | ', ';
}

/** How p-values are written. */
export interface PValueStyle {
  readonly symbol: 'P' | 'p';
  readonly italic: boolean;
  readonly leadingZero: boolean;
  /** "P = 0.03" or "P=0.03". */
  readonly spacing: 'spaced' | 'closed';
  /** Below this "less than" is printed. */
  readonly floor: number;
  /** Above this "greater than" is printed. */
  readonly ceiling: number;
  /** Decimals of a p-value below `below`, in ascending order; the last step ends at 1. */
  readonly decimals: readonly { readonly below: number; readonly decimals: number }[];
}

/** What generated sentences look like apart from their numbers. */
export interface SentenceStyle {
  /** "34 of 163" or "34/163". */
  readonly groupCount: 'nOfN' | 'slash';
  readonly measureNames: 'spelled' | 'abbreviated';
  /** Between the name of a measure and its value: "RR 1.49", "RR, 1.49", "RR = 1.49". */
  readonly measureJoiner: ' ' | ', ' | ' = ';
  readonly versus: string;
  readonly pValue: 'omitted' | 'last';
  /** "NNTB 17" and "NNTH 17", plain "NNT 17", or no number needed at all. */
  readonly numberNeeded: 'byDirection' | 'plain' | 'never';
}

/** Marks and notes of tables. */
export interface TableStyle {
  /** What a reference row prints for a ratio and for a difference. */
  readonly referenceRatio: string;
  readonly referenceDifference: string;
  /** The mark of a cell without a value, and what it means in words; they may be the same. */
  readonly missingCell: { readonly mark: string; readonly meaning: string };
  readonly footnoteMarkers: 'letters' | 'symbols' | 'numbers';
  /** Symbols in their order; doubled when they are used up. */
  readonly footnoteSymbols: readonly string[];
  readonly superscriptMarkers: boolean;
  readonly abbreviations: 'first' | 'last';
  /** Opens the notes, as in "Note. "; may be empty. */
  readonly notesLead: string;
}

/** Number and title of a table or a figure. */
export interface CaptionStyle {
  readonly boldLabel: boolean;
  /** Behind the number: "Table 1. Title". Not printed where the title has its own line. */
  readonly afterNumber: string;
  readonly lines: 'one' | 'two';
  readonly italicTitle: boolean;
  readonly figurePlace: 'above' | 'below';
}

/** The page of a document export. */
export interface PageStyle {
  readonly paper: 'A4' | 'letter';
  readonly marginInMillimetres: number;
  readonly bodyFont: string;
  readonly bodySizeInPoints: number;
  readonly lineSpacing: number;
  readonly headingFont: string;
  readonly tableFont: string;
  readonly tableSizeInPoints: number;
  readonly lineNumbers: boolean;
}

/** Figures as they are exported. */
export interface FigureStyle {
  readonly singleWidthInMillimetres: number;
  readonly doubleWidthInMillimetres: number;
  readonly dotsPerInch: number;
  readonly font: string;
  readonly sizeInPoints: number;
  readonly lineInPoints: number;
}

/**
 * How a report looks and reads in print: numbers, intervals, p-values, tables, captions, page. It
 * never holds a method or a value. Data, read from `templates/house-styles` by `parseHouseStyle`.
 */
export interface HouseStyle {
  readonly schemaVersion: 1;
  readonly id: string;
  readonly name: string;
  /** Day from which these settings hold, as 2026-01-31. */
  readonly effectiveDate: string;
  /** Where the settings come from. */
  readonly sourceNote: string;
  /** Spelling, and the language that a document declares. */
  readonly language: 'en-GB' | 'en-US';
  readonly numbers: NumberStyle;
  readonly percent: PercentStyle;
  readonly difference: { readonly unit: DifferenceUnit };
  /** Fewest decimals of a ratio; values below 1 keep two significant digits. */
  readonly ratio: { readonly decimals: 1 | 2 | 3 };
  readonly interval: IntervalStyle;
  readonly pValue: PValueStyle;
  readonly sentence: SentenceStyle;
  readonly table: TableStyle;
  readonly caption: CaptionStyle;
  readonly page: PageStyle;
  readonly figure: FigureStyle;
}
