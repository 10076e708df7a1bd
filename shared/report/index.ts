export { REPORT_STAGES } from './report';
export type { Block, PinnedAnalysis, Report, ReportStage } from './report';
