import * as z from 'zod/mini';
import { success } from '#shared/core';
import { FRAMINGS } from '#shared/wording/phrase';
import type { MovePin, SetFraming, SetHouseStyle, SetTitle } from './step';
import type { StepDefinition } from './step-definition';
import { idSchema } from './step-schemas';

/** Setting the framing of the report. */
export const SET_FRAMING: StepDefinition<SetFraming> = {
  schema: z.object({ kind: z.literal('setFraming'), framing: z.enum(FRAMINGS) }),
  undoBarrier: false,
  contentChangedOf: () => null,
  actionFor: () => 'setFraming',
  apply: (report, step) =>
    success({
      report: { ...report, framing: step.framing },
      inverse: { ...step, framing: report.framing },
    }),
};

/** Renaming the report. */
export const SET_TITLE: StepDefinition<SetTitle> = {
  schema: z.object({
    kind: z.literal('setTitle'),
    title: z.string().check(z.trim(), z.minLength(1), z.maxLength(300)),
  }),
  undoBarrier: false,
  contentChangedOf: () => null,
  actionFor: () => 'editWordsBlocks',
  apply: (report, step) =>
    success({
      report: { ...report, title: step.title },
      inverse: { ...step, title: report.title },
    }),
};

/** Changing the house style. */
export const SET_HOUSE_STYLE: StepDefinition<SetHouseStyle> = {
  schema: z.object({ kind: z.literal('setHouseStyle'), houseStyleId: idSchema }),
  undoBarrier: false,
  contentChangedOf: () => null,
  actionFor: () => 'editHouseStyle',
  apply: (report, step) =>
    success({
      report: { ...report, houseStyleId: step.houseStyleId },
      inverse: { ...step, houseStyleId: report.houseStyleId },
    }),
};

/** Moving the pin of an analysis to another result. */
export const MOVE_PIN: StepDefinition<MovePin> = {
  schema: z.object({
    kind: z.literal('movePin'),
    analysisId: idSchema,
    resultId: z.nullable(idSchema),
  }),
  undoBarrier: true,
  contentChangedOf: () => null,
  actionFor: () => 'editData',
  apply: (report, step) => {
    const { [step.analysisId]: previous = null, ...others } = report.pins;
    const pins = step.resultId === null ? others : { ...others, [step.analysisId]: step.resultId };
    return success({ report: { ...report, pins }, inverse: { ...step, resultId: previous } });
  },
};
