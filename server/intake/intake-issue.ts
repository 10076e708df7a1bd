import type { Issue } from '#shared/core';

/** Why a file can't be read. Lines and rows are counted from 1, as an editor shows them. */
export type IntakeIssue = Issue<keyof typeof WORDS>;

/** A reason and a way out, in plain words. */
export interface IntakeProblem {
  readonly code: string;
  readonly message: string;
  readonly wayOut: string;
}

/** Says why a file can't be read, and what to do. */
export function intakeProblem({ code, facts = {} }: IntakeIssue): IntakeProblem {
  const { message, wayOut } = WORDS[code];
  return { code, message: filled(message, facts), wayOut: filled(wayOut, facts) };
}

function filled(text: string, facts: NonNullable<IntakeIssue['facts']>): string {
  return text.replace(/\{(\w+)\}/g, (whole, name: string) => {
    const fact = facts[name];
    return fact === undefined ? whole : String(fact);
  });
}

const SAVE_AS = 'Save it as CSV (UTF-8) or as an Excel workbook (.xlsx) and load that.';

/** Braces name facts of the issue. */
const WORDS = {
  emptyFile: {
    message: 'The file is empty.',
    wayOut: 'Choose a file with a row of column names and at least one row of data.',
  },
  headerOnly: {
    message: 'The file has column names but no row of data.',
    wayOut: 'Choose a file with at least one row of data.',
  },
  unknownType: {
    message: 'Files ending in "{extension}" can\'t be read.',
    wayOut: SAVE_AS,
  },
  notItsType: {
    message: 'The name says {expected}, but the content is {found}.',
    wayOut: SAVE_AS,
  },
  oldOrProtectedWorkbook: {
    message: 'This is a workbook in the old format, or one that needs a password.',
    wayOut: 'Open it, remove the password, and save it as an Excel workbook (.xlsx).',
  },
  binaryContent: {
    message: 'Line {line} holds bytes that are no text.',
    wayOut: SAVE_AS,
  },
  notUtf8: {
    message: 'Line {line} is not valid UTF-8.',
    wayOut: 'Choose Windows-1252 as the encoding, or save the file as UTF-8.',
  },
  mixedEncodings: {
    message: 'Line {line} is not valid UTF-8, though other lines are.',
    wayOut: 'Save the file as UTF-8. If it is Windows-1252 after all, choose that as the encoding.',
  },
  unknownEncoding: {
    message: 'Line {line} is neither UTF-8 nor Windows-1252.',
    wayOut: 'Save the file as UTF-8 and load that.',
  },
  badDelimiter: {
    message: "The character {delimiter} can't separate columns.",
    wayOut: 'Choose a comma, a semicolon, a tab, or another single character.',
  },
  raggedRow: {
    message: 'Line {line} has {found}, and the row of column names has {expected}.',
    wayOut:
      'Correct that line. If most lines are like it, choose another character between columns.',
  },
  strayQuote: {
    message: 'Line {line} has text after a closing quotation mark.',
    wayOut: 'Double the quotation marks that stand inside a quoted cell.',
  },
  quoteNotClosed: {
    message: 'The quotation mark that opens in line {line} is never closed.',
    wayOut: 'Close it, or double it where it is part of the text.',
  },
  rowTooLong: {
    message: 'The row at line {line} goes on for more than {limit}.',
    wayOut: 'Look for a quotation mark that is not closed.',
  },
  cellTooLong: {
    message: 'A cell in line {line}, column "{column}", is longer than {limit}.',
    wayOut: "Leave long texts out; they can't be counted.",
  },
  tooManyColumns: {
    message: 'The file has more than {limit} columns.',
    wayOut: 'Leave out columns that the analysis does not need.',
  },
  nameTooLong: {
    message: 'The name of column {position} is longer than {limit} characters.',
    wayOut: 'Check that the first row holds the column names.',
  },
  tooMuchText: {
    message: 'The columns hold more than {limit} of different texts, most of it in "{column}".',
    wayOut: 'Leave out columns of free text.',
  },
  damagedWorkbook: {
    message: "The workbook is damaged: {part} can't be read.",
    wayOut: 'Open it, save it anew as an Excel workbook (.xlsx), and load that.',
  },
  workbookTooLarge: {
    message: 'The workbook unpacks to more than {limit}, far more than it weighs.',
    wayOut: 'Delete unused sheets and formatted empty rows, or save the sheet as CSV.',
  },
  noSuchSheet: {
    message: 'The workbook has no sheet "{sheet}".',
    wayOut: 'Choose one of its sheets: {sheets}.',
  },
  emptyWorkbook: {
    message: 'No sheet of the workbook holds data.',
    wayOut: 'Choose a workbook with a row of column names and at least one row of data.',
  },
  rowsOutOfOrder: {
    message: "Row {line} of the sheet is out of order, so the sheet can't be read row by row.",
    wayOut: 'Open it, save it anew as an Excel workbook (.xlsx), and load that.',
  },
  interrupted: {
    message: 'Reading was interrupted when the server stopped.',
    wayOut: 'Load the file again.',
  },
  readerFailed: {
    message: 'Reading the file failed unexpectedly; the server has written down why.',
    wayOut: SAVE_AS,
  },
} as const;
