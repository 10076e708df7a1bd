import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { expect, it } from 'vitest';
import { Field } from './field';
import { FieldControl } from './field-control';

@Component({
  imports: [Field, FieldControl],
  selector: 'eh-field-host',
  template: `
    <eh-field label="Report name" [help]="help()" [problem]="problem()">
      <input ehControl />
    </eh-field>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class FieldHost {
  readonly help = signal('');
  readonly problem = signal<string | null>(null);
}

async function draw() {
  const fixture = TestBed.createComponent(FieldHost);
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  return { fixture, element, input: element.querySelector('input')! };
}

it('ties the label to its control', async () => {
  const { element, input } = await draw();
  expect(element.querySelector('label')!.htmlFor).toBe(input.id);
  expect(input.id).not.toBe('');
});

it('describes the control by its help and its problem, and marks it', async () => {
  const { fixture, element, input } = await draw();
  fixture.componentInstance.help.set('It is printed.');
  fixture.componentInstance.problem.set('Give the report a name.');
  await fixture.whenStable();
  const described = (input.getAttribute('aria-describedby') ?? '').split(' ');
  expect(described.map((id) => element.querySelector(`#${id}`)!.textContent.trim())).toEqual([
    'It is printed.',
    'Give the report a name.',
  ]);
  expect(input.getAttribute('aria-invalid')).toBe('true');
});

it('takes the mark away when nothing is wrong', async () => {
  const { fixture, input } = await draw();
  fixture.componentInstance.problem.set('Give the report a name.');
  await fixture.whenStable();
  fixture.componentInstance.problem.set(null);
  await fixture.whenStable();
  expect(input.getAttribute('aria-invalid')).toBe('false');
  expect(input.hasAttribute('aria-describedby')).toBe(false);
});
