import type { Sequelize } from 'sequelize';
import { AnalysisStore } from './analysis/analysis-store';
import { BlockStore } from './block/block-store';
import { CodeBookStore } from './code-book/code-book-store';
import { ColumnChunkStore } from './cut/column-chunk-store';
import { CutColumnStore } from './cut/cut-column-store';
import { CutFactsStore } from './cut/cut-facts-store';
import { CutStore } from './cut/cut-store';
import { DataSetStore } from './data-set/data-set-store';
import { DraftStore } from './draft/draft-store';
import { MailStore } from './mail/mail-store';
import { OutsideEstimateStore } from './outside-estimate/outside-estimate-store';
import { ReportPinStore } from './report/report-pin-store';
import { ReportStore } from './report/report-store';
import { ResultStore } from './result/result-store';
import { SessionStore } from './session/session-store';
import { SiteSettingStore } from './site-setting/site-setting-store';
import { StepStore } from './step/step-store';
import { MembershipStore } from './study/membership-store';
import { MilestoneStore } from './study/milestone-store';
import { OutcomeStore } from './study/outcome-store';
import { StudyFiguresStore } from './study/study-figures-store';
import { StudyStore } from './study/study-store';
import { TallyStore } from './tally/tally-store';
import { TokenStore } from './token/token-store';
import { TrailStore } from './trail/trail-store';
import { UploadStore } from './upload/upload-store';
import { UserStore } from './user/user-store';

const STORES = {
  users: UserStore,
  sessions: SessionStore,
  tokens: TokenStore,
  mail: MailStore,
  siteSettings: SiteSettingStore,
  studies: StudyStore,
  studyFigures: StudyFiguresStore,
  outcomes: OutcomeStore,
  milestones: MilestoneStore,
  memberships: MembershipStore,
  trail: TrailStore,
  dataSets: DataSetStore,
  codeBooks: CodeBookStore,
  cutFacts: CutFactsStore,
  cuts: CutStore,
  cutColumns: CutColumnStore,
  columnChunks: ColumnChunkStore,
  uploads: UploadStore,
  tallies: TallyStore,
  analyses: AnalysisStore,
  outsideEstimates: OutsideEstimateStore,
  results: ResultStore,
  reports: ReportStore,
  reportPins: ReportPinStore,
  blocks: BlockStore,
  steps: StepStore,
  drafts: DraftStore,
} as const;

/** Every store by name. A new one is a line in the table above. */
export type Stores = {
  readonly [Name in keyof typeof STORES]: InstanceType<(typeof STORES)[Name]>;
};

/** Binds every store to a database. */
export function createStores(sequelize: Sequelize): Stores {
  const entries = Object.entries(STORES).map(([name, Store]) => [name, new Store(sequelize)]);
  return Object.fromEntries(entries) as Stores;
}
