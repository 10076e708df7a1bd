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
