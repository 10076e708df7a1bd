export type { BlockContext, PinnedAnalyses, PrintSetting } from './blocks/block-context';
export { fieldValue, withFieldValue } from './blocks/block-field';
export type { BlockField } from './blocks/block-field';
export type {
  BlockKind,
  BlockRights,
  EditableText,
  EmptyContentContext,
} from './blocks/block-kind';
export {
  analysisIdsOf,
  BLOCK_KIND_LIST,
  BLOCK_KINDS,
  blockKindOf,
  parseContent,
} from './blocks/block-kinds';
export type { BlockKindId } from './blocks/block-kinds';
export { boundText } from './blocks/bound-value';
export { formatsOf } from './blocks/value-formats';
export type { EffectSentenceContent } from './blocks/effect-sentence/content';
export type { GroupedBarChartContent } from './blocks/grouped-bar-chart/content';
export type { HeadingContent } from './blocks/heading/heading';
export type { ProseContent } from './blocks/prose/prose';
export type { StratifiedTableContent, TableChoice } from './blocks/stratified-table/content';
export { composeReport, createComposer } from './compose/compose-report';
export type { Composer, ComposeRequest } from './compose/compose-report';
export { mapRuns, runsOf } from './compose/element-runs';
export { valueLedger } from './compose/value-ledger';
export type { PrintedNumber } from './compose/value-ledger';
export type { ContentIssue, ContentIssueCode } from './content-issue';
export { isOrderKey, placeAfter, visibleBlocks } from './order';
export type { Placement } from './order';
export { pinValues } from './pin-values';
export { REPORT_STAGES } from './report';
export type { Block, PinnedAnalysis, Report, ReportStage } from './report';
export { reportIssueText } from './report-issue-text';
export {
  actionForStep,
  applyStep,
  contentChangedBy,
  isUndoBarrier,
  parseStep,
} from './steps/apply-step';
export { rebaseStep } from './steps/rebase-step';
export { undoStep } from './steps/undo-step';
export type { RecordedStep } from './steps/undo-step';
export type { AppliedStep, StepMoment } from './steps/step-definition';
export type {
  EditText,
  InsertBlock,
  MoveBlock,
  MovePin,
  RemoveBlock,
  ReplaceContent,
  RestoreBlock,
  SetFraming,
  SetHouseStyle,
  SetTitle,
  Step,
  StepIssue,
  StepIssueCode,
  StepKind,
} from './steps/step';
export { valueWords } from './value-words';
export type { ValueWords } from './value-words';
