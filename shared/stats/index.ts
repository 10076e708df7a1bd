export type {
  Estimate,
  EstimationIssue,
  EstimationIssueCode,
  Interval,
  TestOutcome,
} from './estimate';
export type { FourfoldTable, GroupCount, StratifiedTable, TableStratum } from './fourfold-table';
