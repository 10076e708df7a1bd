import { TestBed } from '@angular/core/testing';
import { MAT_DIALOG_DATA, MatDialogRef } from '@angular/material/dialog';
import type { OutsideEstimate, OutsideEstimateEntry } from '#shared/outside-estimates';
import { of, throwError } from 'rxjs';
import { expect, it } from 'vitest';
import { ApiProblem } from '../../server-api/api-problem';
import { OutsideEstimatesApi } from '../../server-api/outside-estimates-api';
import { wetWorkPrint } from '../testing/wet-work';
import { EstimateDialog, type EstimateRequest } from './estimate-dialog';
import { covariatesIn, entryIn, estimateForm } from './estimate-form';
import { outsideRows } from './outside-rows';

const PLACE = { studyId: 's', analysisId: 'a' };

const ESTIMATE: OutsideEstimate = {
  id: 'e',
  ...PLACE,
  version: 3,
  levelId: 'much',
  referenceLevelId: 'none',
  measure: 'oddsRatio',
  value: '2.50',
  lower: '1.20',
  upper: '5.21',
  level: 0.95,
  pValue: null,
  method: 'logistic regression',
  covariates: ['age', 'sex'],
  numberAnalysed: 440,
  source: 'Statistics group',
  computedOn: null,
  note: null,
};

it('reads what was typed as an entry, digits and all', () => {
  const form = estimateForm(ESTIMATE, { levelId: '', level: 0.95, measure: 'oddsRatio' });
  expect(entryIn(form, 'none')).toMatchObject({
    levelId: 'much',
    value: '2.50',
    level: 0.95,
    covariates: ['age', 'sex'],
    numberAnalysed: 440,
  });
  form.patchValue({ levelId: '', numberAnalysed: ' 1,204 ', level: '99.9', pValue: ' ' });
  expect(entryIn(form, 'none')).toMatchObject({
    levelId: null,
    numberAnalysed: 1204,
    level: 0.999,
    pValue: null,
  });
});

it.each([
  ['12', false],
  ['95', true],
  ['99.9%', true],
  ['100', false],
  ['', false],
])('takes %j as a level of confidence: %s', (level, valid) => {
  const form = estimateForm(ESTIMATE, { levelId: '', level: 0.95, measure: 'oddsRatio' });
  form.controls.level.setValue(level);
  expect(form.controls.level.valid).toBe(valid);
});

it('parts covariates by semicolons, or by commas where there are none', () => {
  expect(covariatesIn('age; sex, three groups;')).toEqual(['age', 'sex, three groups']);
  expect(covariatesIn('age, sex')).toEqual(['age', 'sex']);
  expect(covariatesIn(' ')).toEqual([]);
});

it('lists an estimate beside its crude number, with what the checks say', () => {
  const [row] = outsideRows([ESTIMATE], wetWorkPrint());
  expect(row).toMatchObject({
    level: 'Much',
    measure: 'odds ratio',
    value: '2.50',
    limits: '(1.20 to 5.21)',
    crude: '2.67',
    model: 'logistic regression; age, sex',
    notes: [],
  });
  const [other] = outsideRows(
    [{ ...ESTIMATE, numberAnalysed: 380, upper: '6.21' }],
    wetWorkPrint(),
  );
  expect(other?.notes.map(({ tone, tag }) => `${tone} ${tag}`)).toEqual([
    'caution Caution',
    'clear Note',
  ]);
});

async function open(estimate: OutsideEstimate | null, api: Partial<OutsideEstimatesApi>) {
  const closed: unknown[] = [];
  const request: EstimateRequest = { place: PLACE, print: wetWorkPrint(), estimate };
  TestBed.configureTestingModule({
    providers: [
      { provide: MAT_DIALOG_DATA, useValue: request },
      { provide: MatDialogRef, useValue: { close: (answer: unknown) => closed.push(answer) } },
      { provide: OutsideEstimatesApi, useValue: api },
    ],
  });
  const fixture = TestBed.createComponent(EstimateDialog);
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const type = async (name: string, text: string): Promise<void> => {
    const input = element.querySelector<HTMLInputElement>(`[formcontrolname="${name}"]`)!;
    input.value = text;
    input.dispatchEvent(new Event('input'));
    await fixture.whenStable();
  };
  const send = async (): Promise<void> => {
    element.querySelector('form')!.dispatchEvent(new Event('submit'));
    await fixture.whenStable();
  };
  return { element, type, send, closed };
}

it('says what it finds as one types, and nothing of what is still empty', async () => {
  const { element, type } = await open(null, {});
  expect(element.textContent).not.toContain('cannot be read');
  await type('value', '2,5');
  expect(element.textContent).toContain('“2,5” cannot be read as a number');
  await type('value', '9.50');
  await type('lower', '1.20');
  await type('upper', '5.21');
  expect(element.textContent).toContain('do not hold the estimate 9.50');
  await type('value', '2.50');
  expect(element.textContent).not.toContain('do not hold');
});

it('changes an estimate against its version', async () => {
  const sent: (OutsideEstimateEntry & { readonly baseVersion: number })[] = [];
  const { type, send, closed } = await open(ESTIMATE, {
    change: (_place, _id, request) => {
      sent.push(request);
      return of({ ...ESTIMATE, version: 4 });
    },
  });
  await type('source', 'Second analyst');
  await send();
  expect(sent).toMatchObject([{ baseVersion: 3, source: 'Second analyst', value: '2.50' }]);
  expect(closed).toMatchObject([{ version: 4 }]);
});

it('keeps what was typed when the server refuses it, and says why beside the field', async () => {
  const fields = [{ path: 'value', message: 'The limits do not hold it.' }];
  const refusal = new ApiProblem({ code: 'invalidRequest', title: 'No.', fields });
  const { element, send, closed } = await open(ESTIMATE, {
    change: () => throwError(() => refusal),
  });
  await send();
  expect(element.textContent).toContain('The limits do not hold it.');
  expect(element.querySelector<HTMLInputElement>('[formcontrolname="value"]')!.value).toBe('2.50');
  expect(closed).toEqual([]);
});
