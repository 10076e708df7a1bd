import { TestBed } from '@angular/core/testing';
import type { Balance } from '#shared/wording';
import { expect, it } from 'vitest';
import { BalancePanel } from './balance-panel';

const BALANCE: Balance = {
  absolute: {
    available: true,
    direction: 'higher',
    sizeText: '+16.2',
    unitText: 'percentage points',
    intervalText: '95% CI 9.7 to 23.4',
    secondText: 'one more for every 7',
  },
  relative: {
    available: true,
    direction: 'higher',
    sizeText: '4.5×',
    unitText: 'the risk',
    intervalText: '95% CI 2.3 to 8.6',
    secondText: null,
  },
  gauge: {
    kind: 'risks',
    referenceRisk: 0.0466,
    absolute: { value: 0.2086, lower: 0.1436, upper: 0.2806 },
    relative: { value: 0.2086, lower: 0.109, upper: 0.4 },
    gapText: null,
  },
  referenceLabel: 'None',
  indexLabel: 'Over 6 h',
  name: 'Absolute: +16.2 percentage points. Relative: 4.5× the risk.',
};

async function draw(balance: Balance) {
  const fixture = TestBed.createComponent(BalancePanel);
  fixture.componentRef.setInput('balance', balance);
  fixture.componentRef.setInput('framing', 'absolute');
  await fixture.whenStable();
  return { fixture, element: fixture.nativeElement as HTMLElement };
}

function radios(element: HTMLElement): HTMLInputElement[] {
  return [...element.querySelectorAll('input')];
}

it('keeps both sizes in sight and marks the one that is said', async () => {
  const { element } = await draw(BALANCE);
  expect(element.textContent).toContain('+16.2');
  expect(element.textContent).toContain('4.5×');
  expect([...element.querySelectorAll('.said')].map(({ className }) => className)).toEqual([
    'absolute said',
  ]);
});

it('takes the framing that is chosen', async () => {
  const { fixture, element } = await draw(BALANCE);
  radios(element)[1]!.click();
  await fixture.whenStable();
  expect(fixture.componentInstance.framing()).toBe('both');
  expect(element.querySelectorAll('.said')).toHaveLength(3);
});

it('names the gauge by both sizes', async () => {
  const { element } = await draw(BALANCE);
  expect(element.querySelector('svg[role=img]')!.getAttribute('aria-label')).toBe(BALANCE.name);
});

it('says why a side is missing, and lets nobody choose it or both', async () => {
  const { element } = await draw({
    ...BALANCE,
    absolute: { available: false, reason: 'Cases and controls give no risks.' },
  });
  expect(element.textContent).toContain('Cases and controls give no risks.');
  expect(radios(element).map(({ disabled }) => disabled)).toEqual([true, true, false]);
});
