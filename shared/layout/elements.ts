import type { ValueAddress } from '#shared/analysis';

/** Character styles that every format can draw. */
export type RunMark = 'bold' | 'italic' | 'superscript' | 'subscript' | 'secondary';

/** Where a run's words come from; provenance, the audit and compare read it. */
export interface RunOrigin {
  readonly blockId: string;
  /** `bound` values follow their source; `missing` ones have lost it; `typed` digits have none. */
  readonly state: 'text' | 'bound' | 'missing' | 'typed';
  /** The values that the run prints, in order (an estimate with limits has three). */
  readonly addresses: readonly ValueAddress[];
}

/** Text in one style, with its origin. A line feed in `text` is a line break. */
export interface Run {
  readonly text: string;
  readonly marks?: readonly RunMark[];
  readonly origin?: RunOrigin;
  readonly link?: string;
  /** Block id of the table or figure that `text` ("Table 2") refers to, for a link inside. */
  readonly reference?: string;
  /** Short form of a generated abbreviation; at its first use `text` gives the long form too. */
  readonly abbreviation?: string;
}

/** A number behind a printed cell, for formats that keep numbers as numbers. */
export interface CellNumber {
  /** Full precision; a share is 0..1 and is scaled only by `scale`. */
  readonly value: number;
  /** The printed figure is `value * scale` (100 for a percent or percentage points). */
  readonly scale: number;
  readonly decimals: number;
  readonly signed: boolean;
  /** What the cell prints for it, under the house style. */
  readonly text: string;
  readonly address: ValueAddress;
}

/** A column of a table; `parts` name the numbers that one cell holds ("estimate", "lower" …). */
export interface TableColumn {
  readonly id: string;
  readonly align: 'start' | 'end' | 'center';
  /** Share of the table's width, 0..1; all columns sum to 1. */
  readonly width: number;
  readonly parts: readonly { readonly id: string; readonly label: string }[];
}

/** A head cell; spans columns (spanners) or head rows. */
export interface TableHeadCell {
  readonly runs: readonly Run[];
  readonly columnSpan: number;
  readonly rowSpan: number;
  readonly align: 'start' | 'end' | 'center';
}

/** A body cell; `numbers` has one entry per part of its column, null where it prints words. */
export interface TableBodyCell {
  readonly runs: readonly Run[];
  readonly numbers: readonly (CellNumber | null)[];
}

/** A body row. A `group` row has one cell that spans the table (a stratum's name). */
export interface TableRow {
  readonly kind: 'group' | 'level' | 'total' | 'test';
  readonly indent: 0 | 1;
  readonly cells: readonly TableBodyCell[];
}

/** A bar of a grouped bar chart, with its interval; null where the value is not estimable. */
export interface ChartBar {
  readonly categoryId: string;
  readonly groupId: string;
  readonly events: number;
  readonly total: number;
  /** The total as it prints, thousands grouped. */
  readonly totalText: string;
  readonly value: number | null;
  readonly lower: number | null;
  readonly upper: number | null;
  readonly valueText: string;
  /** Of the value, where there is one, and of the total. */
  readonly addresses: readonly ValueAddress[];
}

/**
 * What a figure shows, as plain data. Labels are data only; `shared/figures` turns it into a
 * Vega-Lite specification whose fields have fixed names.
 */
export interface GroupedBarFigure {
  readonly kind: 'groupedBars';
  /** `note` is the n of each group in words, for where the bars are too narrow to print theirs. */
  readonly categories: readonly {
    readonly id: string;
    readonly label: string;
    readonly note: string;
  }[];
  readonly groups: readonly { readonly id: string; readonly label: string }[];
  readonly groupsLabel: string | null;
  readonly categoriesLabel: string;
  readonly valueLabel: string;
  /** 100 prints percent. */
  readonly valueScale: number;
  readonly decimalMark: '.' | '·' | ',';
  readonly bars: readonly ChartBar[];
  readonly showValues: boolean;
  readonly ordered: boolean;
}

/** Every kind of figure. */
export type FigureModel = GroupedBarFigure;

/** Number and title of a table or a figure. */
export interface Caption {
  readonly label: 'Table' | 'Figure';
  readonly number: number;
  readonly runs: readonly Run[];
}

interface ElementBase {
  readonly blockId: string;
}

/** A heading of the report; level 1 is the largest below the title. */
export interface HeadingElement extends ElementBase {
  readonly kind: 'heading';
  readonly level: 1 | 2 | 3;
  readonly runs: readonly Run[];
}

/** A paragraph of body text. */
export interface ParagraphElement extends ElementBase {
  readonly kind: 'paragraph';
  readonly runs: readonly Run[];
}

/** An item of a list; `ordered` says whether its own (perhaps nested) list is numbered. */
export interface ListItem {
  readonly depth: number;
  readonly ordered: boolean;
  readonly runs: readonly Run[];
}

/** A list; items are paragraphs of runs, one level deep or nested by `depth`. */
export interface ListElement extends ElementBase {
  readonly kind: 'list';
  readonly ordered: boolean;
  readonly items: readonly ListItem[];
}

/** A three-rule table. */
export interface TableElement extends ElementBase {
  readonly kind: 'table';
  readonly caption: Caption;
  readonly columns: readonly TableColumn[];
  readonly head: readonly (readonly TableHeadCell[])[];
  readonly rows: readonly TableRow[];
  readonly notes: readonly (readonly Run[])[];
}

/** A figure with the words and the numbers that stand for it. */
export interface FigureElement extends ElementBase {
  readonly kind: 'figure';
  readonly caption: Caption;
  readonly figure: FigureModel;
  readonly altText: string;
  readonly notes: readonly (readonly Run[])[];
}

/** Something that cannot be printed, said in words, in the place where it would stand. */
export interface ProblemElement extends ElementBase {
  readonly kind: 'problem';
  readonly message: string;
}

/** The closed set of what renderers draw. */
export type LayoutElement =
  | HeadingElement
  | ParagraphElement
  | ListElement
  | TableElement
  | FigureElement
  | ProblemElement;

/** A composed report: what the proof, DOCX and XLSX draw. */
export interface ComposedReport {
  readonly title: string;
  readonly elements: readonly LayoutElement[];
  /** Abbreviations used, alphabetical, for the notes. */
  readonly abbreviations: readonly { readonly short: string; readonly long: string }[];
}
