export { adoptIds } from './adopt-ids';
export type { CodeBookDifference } from './carry-column';
export { carryOver } from './carry-over';
export type { CarriedCodeBook } from './carry-over';
export { COLUMN_KINDS, COUNTED_OUTCOME_COLUMN_ID } from './code-book';
export type {
  CodeBook,
  CodeBookBand,
  CodeBookColumn,
  CodeBookLevel,
  ColumnKind,
  CountLayout,
  FactorLevel,
  MissingCode,
  StratumWords,
} from './code-book';
export { bandColumn, cutPointsOf, removeBands } from './edit-bands';
export type { NumberGrain } from './edit-bands';
export { changeKind, renameColumn, replaceColumn, setLayout } from './edit-column';
export type { ColumnWords } from './edit-column';
export { mergeLevels, moveLevel, renameLevel, setReference, splitLevel } from './edit-levels';
export type { CodeBookEditIssue, EditedColumn, LevelWords } from './edit-levels';
export { codeBookEditMessage } from './edit-messages';
export { markMissing, unmarkMissing } from './edit-missing';
export { FACTOR_SOURCE, factorLevels } from './factor-levels';
export type { CodeBookFinding, CodeBookFindingCode, FindingSeverity } from './finding';
export { guessKind } from './guess-kind';
export { columnIdsFor, levelIdFor } from './ids';
export { orderCodes } from './level-order';
export type { OrderedCodes, OrderGround } from './level-order';
export { BLANK_REASON, missingReasonOf } from './missing-words';
export { isCount, parseNumber } from './numerals';
export type { DecimalMark } from './numerals';
export type { ColumnContents, FileProfile, ProfiledColumn, ValueCount } from './profile';
export { proposeCodeBook } from './propose-code-book';
export { levelsOfCodes, NOT_A_NUMBER } from './propose-column';
export { sentenceLabelOfName } from './labels';
export { countColumnIds, COUNTED_OUTCOME_LEVEL_IDS, countedOutcomeColumn } from './propose-layout';
export type { DataValues } from './validate-against-data';
export { validateCodeBook } from './validate-code-book';
export { countFault } from './validate-counts';
