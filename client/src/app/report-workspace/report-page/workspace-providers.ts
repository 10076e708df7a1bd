import type { Provider } from '@angular/core';
import { AnalysisPicker } from '../block-actions/analysis-picker';
import { BlockActions } from '../block-actions/block-actions';
import { StudyAnalyses } from '../block-editors/study-analyses';
import { TextEditSession } from '../block-editors/text-edit-session';
import { CheckRemedies } from '../checks/check-remedies';
import { CheckWalk } from '../checks/check-walk';
import { ReportChecks } from '../checks/report-checks';
import { MarginLayout } from '../margins/margin-layout';
import { SourceReader } from '../margins/source-reader';
import { DrawQueue } from '../proof/draw-queue';
import { ProofDesk } from '../proof/proof-desk';
import { ProofWords } from '../proof/proof-words';
import { ReportProof } from '../proof/report-proof';
import { DraftKeeper } from '../report-store/draft-keeper';
import { DraftRecovery } from '../report-store/draft-recovery';
import { ReportState } from '../report-store/report-state';
import { ReportStore } from '../report-store/report-store';
import { ReportSync } from '../report-store/report-sync';
import { SaveState } from '../report-store/save-state';
import { StepTransport } from '../report-store/step-transport';
import { UnsentSteps } from '../report-store/unsent-steps';
import { ReverseContrast } from '../reverse-contrast/reverse-contrast';
import { ValuePicker } from '../value-picker/value-picker';
import { ReportFraming } from './report-framing';
import { UndoActions } from './undo-actions';

/** Everything that lives as long as one report is open. */
export const WORKSPACE_PROVIDERS: readonly Provider[] = [
  ReportState,
  StepTransport,
  UnsentSteps,
  ReportSync,
  ReportStore,
  DraftKeeper,
  DraftRecovery,
  SaveState,
  ReportProof,
  ProofWords,
  DrawQueue,
  ProofDesk,
  AnalysisPicker,
  BlockActions,
  StudyAnalyses,
  TextEditSession,
  ReportChecks,
  CheckWalk,
  CheckRemedies,
  MarginLayout,
  SourceReader,
  ReverseContrast,
  ValuePicker,
  ReportFraming,
  UndoActions,
];
