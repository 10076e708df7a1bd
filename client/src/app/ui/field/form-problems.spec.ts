import { TestBed } from '@angular/core/testing';
import { FormControl, FormGroup, Validators } from '@angular/forms';
import { beforeEach, expect, it } from 'vitest';
import { ApiProblem } from '../../server-api/api-problem';
import { FormProblems } from './form-problems';

let form: FormGroup;
let problems: FormProblems;

const REFUSED = new ApiProblem({
  code: 'invalidRequest',
  title: 'Some of what was sent cannot be used.',
  fields: [{ path: 'title', message: 'Another study has this title.' }],
});

beforeEach(() => {
  form = new FormGroup({
    title: new FormControl('', Validators.required),
    design: new FormControl('cohort'),
  });
  problems = TestBed.runInInjectionContext(
    () => new FormProblems(form, { title: { required: 'Give the study a title.' } }),
  );
});

it('says nothing before a field was left or the form was sent', () => {
  expect(problems.of('title')).toBeNull();
});

it('says what is wrong once the form is sent, and does not let it go', () => {
  expect(problems.check()).toBe(false);
  expect(problems.of('title')).toBe('Give the study a title.');
});

it('says nothing more once it is put right', () => {
  problems.check();
  form.setValue({ title: 'Wet work', design: 'cohort' });
  expect(problems.of('title')).toBeNull();
  expect(problems.check()).toBe(true);
});

it('shows what the server refused beside the field, until that field is changed', () => {
  form.setValue({ title: 'Wet work', design: 'cohort' });
  problems.refuse(REFUSED);
  expect(problems.of('title')).toBe('Another study has this title.');
  form.get('title')!.markAsDirty();
  form.get('title')!.setValue('Wet work 2');
  expect(problems.of('title')).toBeNull();
});

it('explains by the title what no field of the form explains', () => {
  problems.refuse(REFUSED);
  expect(problems.unexplained()).toBeNull();
  const stale = new ApiProblem({ code: 'stale', title: 'Somebody changed it meanwhile.' });
  problems.refuse(stale);
  expect(problems.unexplained()).toBe(stale);
});

it('forgets what was refused when the form is sent again', () => {
  form.setValue({ title: 'Wet work', design: 'cohort' });
  problems.refuse(REFUSED);
  problems.check();
  expect(problems.problem()).toBeNull();
});
