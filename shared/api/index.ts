export {
  accountSchema,
  newAccountRequestSchema,
  accountChangeRequestSchema,
  outboxMailSchema,
} from './administration';
export type {
  Account,
  NewAccountRequest,
  AccountChangeRequest,
  OutboxMail,
} from './administration';
export {
  analysisSpecificationSchema,
  newAnalysisRequestSchema,
  analysisChangeRequestSchema,
  analysisSummarySchema,
  analysisViewSchema,
} from './analyses';
export type {
  NewAnalysisRequest,
  AnalysisChangeRequest,
  AnalysisSummary,
  AnalysisView,
} from './analyses';
export {
  codeBookSchema,
  readingOptionsSchema,
  intakeWarningSchema,
  columnProfileSchema,
  cutProfileSchema,
  uploadViewSchema,
  storeCutRequestSchema,
  typedCountsRequestSchema,
  cutSummarySchema,
  dataSetViewSchema,
  cutViewSchema,
  codeBookViewSchema,
  codeBookChangeRequestSchema,
  tallyRequestSchema,
  tallySchema,
  recordsPageSchema,
} from './data';
export type {
  ReadingOptions,
  IntakeWarning,
  ColumnProfile,
  CutProfile,
  UploadView,
  StoreCutRequest,
  TypedCountsRequest,
  CutSummary,
  DataSetView,
  CutView,
  CodeBookView,
  CodeBookChangeRequest,
  RecordsPage,
} from './data';
export {
  outsideEstimateChangeRequestSchema,
  outsideEstimateEntrySchema,
  outsideEstimateSchema,
} from './outside-estimates';
export type { OutsideEstimateChangeRequest } from './outside-estimates';
export { fieldProblemSchema, problemSchema } from './problem';
export type { Problem } from './problem';
export {
  newReportRequestSchema,
  reportSummarySchema,
  blockSchema,
  stepSubmissionSchema,
  stepsRequestSchema,
  acceptedStepSchema,
  stepsViewSchema,
  draftSchema,
  draftRequestSchema,
  reportViewSchema,
} from './reports';
export type {
  NewReportRequest,
  ReportSummary,
  StepSubmission,
  StepsRequest,
  AcceptedStep,
  StepsView,
  DraftView,
  DraftRequest,
  ReportView,
} from './reports';
export {
  newPasswordSchema,
  emailSchema,
  signInRequestSchema,
  personSchema,
  sessionViewSchema,
  firstAdministratorRequestSchema,
  passwordChangeRequestSchema,
  passwordResetRequestSchema,
  passwordResetCompletionSchema,
} from './session';
export type {
  SignInRequest,
  Person,
  SessionView,
  FirstAdministratorRequest,
  PasswordChangeRequest,
  PasswordResetRequest,
  PasswordResetCompletion,
} from './session';
export {
  outcomeWordsSchema,
  milestoneSchema,
  memberSchema,
  newStudyRequestSchema,
  studyChangeRequestSchema,
  studySummarySchema,
  studyViewSchema,
  newMemberRequestSchema,
  memberChangeRequestSchema,
} from './studies';
export type {
  Milestone,
  Member,
  NewStudyRequest,
  StudyChangeRequest,
  StudySummary,
  StudyView,
  NewMemberRequest,
  MemberChangeRequest,
} from './studies';
