import type { Report, ReportStage, Step } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import type { ServerIssue } from '../../errors/server-issue';

/** What the server knows against a step before it is applied; null when there is nothing. */
export function stepProblem(
  { houseStyles }: Dependencies,
  report: Report,
  step: Step,
): ServerIssue | null {
  if (!OPEN_FOR_STEPS[report.stage]) return { code: 'reportClosed' };
  switch (step.kind) {
    case 'movePin':
      return { code: 'pinsMoveThemselves' };
    case 'setHouseStyle':
      return houseStyles.some(({ id }) => id === step.houseStyleId)
        ? null
        : { code: 'stepNotUsable', detail: 'There is no such house style.' };
    case 'insertBlock':
    case 'removeBlock':
    case 'restoreBlock':
    case 'moveBlock':
    case 'replaceContent':
    case 'editText':
    case 'setFraming':
    case 'setTitle':
      return null;
  }
}

const OPEN_FOR_STEPS: Readonly<Record<ReportStage, boolean>> = {
  drafting: true,
  inReview: true,
  signedOff: false,
  submitted: false,
  superseded: false,
};
