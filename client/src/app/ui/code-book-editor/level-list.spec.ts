import { TestBed, type ComponentFixture } from '@angular/core/testing';
import type { CodeBookColumn } from '#shared/code-book';
import { beforeEach, expect, it } from 'vitest';
import { levelCounts } from './column-contents';
import { LevelList } from './level-list';

const column: CodeBookColumn = {
  id: 'dose',
  name: 'dose',
  kind: 'orderedCategory',
  label: 'Dose',
  sentenceLabel: 'dose',
  unit: null,
  levels: ['none', 'low', 'high'].map((code) => ({
    id: code,
    codes: [code],
    label: code,
    sentenceLabel: code,
  })),
  bands: [],
  missingCodes: [],
  referenceLevelId: 'none',
};

let fixture: ComponentFixture<LevelList>;
let changed: CodeBookColumn[];
let element: HTMLElement;

beforeEach(async () => {
  fixture = TestBed.createComponent(LevelList);
  fixture.componentRef.setInput('column', column);
  fixture.componentRef.setInput('counts', levelCounts(column, null, '.'));
  changed = [];
  fixture.componentInstance.changed.subscribe((next) => changed.push(next));
  await fixture.whenStable();
  element = fixture.nativeElement as HTMLElement;
});

const labels = () =>
  [...element.querySelectorAll<HTMLInputElement>('.level .in-tables')].map(({ value }) => value);
const press = (target: Element, key: string) =>
  target.dispatchEvent(new KeyboardEvent('keydown', { key, altKey: true, bubbles: true }));

it('shows the levels in print order, the reference marked', () => {
  expect(labels()).toEqual(['none', 'low', 'high']);
  const radios = [...element.querySelectorAll<HTMLInputElement>('input[type=radio]')];
  expect(radios.map(({ checked }) => checked)).toEqual([true, false, false]);
});

it('moves a level by Alt with an arrow, and says where it is now', async () => {
  press(element.querySelectorAll('.level .in-tables')[1]!, 'ArrowDown');
  expect(changed.at(-1)?.levels.map(({ id }) => id)).toEqual(['none', 'high', 'low']);
  await fixture.whenStable();
  expect(element.querySelector('[role=status]')?.textContent).toBe('low is now 3 of 3.');
});

it('stops at the ends', () => {
  press(element.querySelectorAll('.level .in-tables')[0]!, 'ArrowUp');
  expect(changed).toEqual([]);
});

it('merges the levels that are picked', async () => {
  const picks = [...element.querySelectorAll<HTMLInputElement>('.pick')];
  picks[1]!.click();
  picks[2]!.click();
  await fixture.whenStable();
  const merge = [...element.querySelectorAll('button')].find(
    ({ textContent }) => textContent.trim() === 'Merge 2 levels',
  );
  merge!.click();
  expect(changed.at(-1)?.levels.map(({ codes }) => codes)).toEqual([['none'], ['low', 'high']]);
});

it('lets nothing be changed by who only reads', async () => {
  fixture.componentRef.setInput('readOnly', true);
  await fixture.whenStable();
  expect(element.querySelectorAll('.pick, .grab')).toHaveLength(0);
  press(element.querySelectorAll('.level .in-tables')[1]!, 'ArrowDown');
  expect(changed).toEqual([]);
});
