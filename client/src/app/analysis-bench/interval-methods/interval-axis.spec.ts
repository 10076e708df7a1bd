import { expect, it } from 'vitest';
import { linearAxis, logarithmicAxis } from './interval-axis';

const ticksOf = (axis: { ticks: readonly { value: number }[] }) =>
  axis.ticks.map((tick) => Number(tick.value.toPrecision(12)));

it.each([
  [
    [11.1, 24.4],
    [0, 5, 10, 15, 20, 25],
  ],
  [
    [-3.7, 6.8],
    [-4, -2, 0, 2, 4, 6, 8],
  ],
  [
    [-0.2, -0.05],
    [-0.2, -0.15, -0.1, -0.05, 0],
  ],
  [
    [0, 0],
    [0, 0.2],
  ],
])('puts round ticks under %j', (values, ticks) => {
  expect(ticksOf(linearAxis(values))).toEqual(ticks);
});

it('starts at zero where all limits lie above it', () => {
  expect(linearAxis([11.1, 24.4]).at(0)).toBe(0);
});

it.each([
  [
    [2.3, 17.1],
    [1, 2, 5, 10, 20],
  ],
  [
    [0.06, 0.43],
    [0.05, 0.1, 0.2, 0.5, 1],
  ],
  [
    [0.8, 1.3],
    [0.7, 1, 1.5],
  ],
  [
    [0.001, 900],
    [0.001, 0.01, 0.1, 1, 10, 100, 1000],
  ],
])('puts round factors under %j', (values, ticks) => {
  expect(ticksOf(logarithmicAxis(values))).toEqual(ticks);
});

it('lays equal factors at equal distances', () => {
  const axis = logarithmicAxis([0.25, 4]);
  expect(axis.at(2) - axis.at(1)).toBeCloseTo(axis.at(1) - axis.at(0.5), 12);
});
