import { FormControl, FormGroup, type ValidatorFn, Validators } from '@angular/forms';
import type { OutsideEstimate, OutsideEstimateEntry } from '#shared/outside-estimates';
import { OUTSIDE_MEASURES, type OutsideMeasureId } from '#shared/outside-estimates';
import type { FieldMessages } from '../../ui/field/form-problems';

/** Stands for all levels together in the list of levels. */
export const ALL_LEVELS = '';

const PERCENT = 100;

type Text = FormControl<string>;

/** The form of an estimate; numbers are texts, so that their digits stay as they are typed. */
export type EstimateForm = FormGroup<{
  levelId: Text;
  measure: FormControl<OutsideMeasureId>;
  value: Text;
  lower: Text;
  upper: Text;
  level: Text;
  pValue: Text;
  method: Text;
  covariates: Text;
  numberAnalysed: Text;
  source: Text;
  computedOn: Text;
  note: Text;
}>;

/** What a new estimate starts with. */
export interface EstimateStart {
  readonly levelId: string;
  readonly level: number;
  readonly measure: OutsideMeasureId;
}

/** The form, filled with an estimate that is changed. */
export function estimateForm(estimate: OutsideEstimate | null, start: EstimateStart): EstimateForm {
  const levelId = estimate === null ? start.levelId : (estimate.levelId ?? ALL_LEVELS);
  return new FormGroup({
    levelId: text(levelId),
    measure: new FormControl(estimate?.measure ?? start.measure, NOT_NULL),
    value: text(estimate?.value, FILLED),
    lower: text(estimate?.lower, FILLED),
    upper: text(estimate?.upper, FILLED),
    level: text(percentText(estimate?.level ?? start.level), [
      Validators.required,
      Validators.pattern(LEVEL),
    ]),
    pValue: text(estimate?.pValue),
    method: text(estimate?.method, FILLED),
    covariates: text(estimate?.covariates.join('; ')),
    numberAnalysed: text(numberText(estimate?.numberAnalysed), [Validators.pattern(WHOLE)]),
    source: text(estimate?.source, FILLED),
    computedOn: text(estimate?.computedOn),
    note: text(estimate?.note),
  });
}

function text(value: string | null | undefined, validators: readonly ValidatorFn[] = []): Text {
  return new FormControl(value ?? '', { ...NOT_NULL, validators: [...validators] });
}

const NOT_NULL = { nonNullable: true } as const;
const FILLED = [Validators.required, Validators.pattern(/\S/)];
const WHOLE = /^\s*[1-9][\d ,]{0,14}\s*$/;
const LEVEL = /^\s*(?:5[1-9]|[6-9]\d)(?:\.\d{1,3})?\s*%?\s*$/;

/** What to say about a field that is not filled as it has to be. */
export const ESTIMATE_MESSAGES: FieldMessages = {
  value: filled('Enter the estimate.'),
  lower: filled('Enter the lower limit.'),
  upper: filled('Enter the upper limit.'),
  level: {
    required: 'Enter the level of confidence.',
    pattern: 'Write a percentage above 50 and below 100, as in 95.',
  },
  method: filled('Say what kind of model it was.'),
  numberAnalysed: { pattern: 'Write a whole number.' },
  source: filled('Say who or what computed it.'),
};

function filled(words: string): Readonly<Record<string, string>> {
  return { required: words, pattern: words };
}

/** What the form holds as an entry; what is empty stays empty for the checks to pass over. */
export function entryIn(form: EstimateForm, referenceLevelId: string): OutsideEstimateEntry {
  const typed = form.getRawValue();
  const number = typed.numberAnalysed.replace(/[ ,]/g, '');
  const orNull = (text: string): string | null => (text.trim() === '' ? null : text.trim());
  return {
    levelId: typed.levelId === ALL_LEVELS ? null : typed.levelId,
    referenceLevelId,
    measure: typed.measure,
    value: typed.value.trim(),
    lower: typed.lower.trim(),
    upper: typed.upper.trim(),
    level: Number((Number.parseFloat(typed.level) / PERCENT).toPrecision(12)),
    pValue: orNull(typed.pValue),
    method: typed.method.trim(),
    covariates: covariatesIn(typed.covariates),
    numberAnalysed: number === '' ? null : Number(number),
    source: typed.source.trim(),
    computedOn: orNull(typed.computedOn),
    note: orNull(typed.note),
  };
}

/** Covariates are parted by semicolons; commas do where there is no semicolon. */
export function covariatesIn(text: string): readonly string[] {
  const parts = text.includes(';') ? text.split(';') : text.split(',');
  return parts.map((part) => part.trim()).filter((part) => part !== '');
}

function percentText(level: number): string {
  return String(Number((level * PERCENT).toPrecision(12)));
}

function numberText(number: number | null | undefined): string {
  return number === null || number === undefined ? '' : String(number);
}

/** The measures that may be entered. */
export const MEASURES = OUTSIDE_MEASURES;
