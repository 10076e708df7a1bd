import { expect, it } from 'vitest';
import { GroupedNumberPipe } from './grouped-number-pipe';

const pipe = new GroupedNumberPipe();

it('groups thousands, and keeps as many decimals as are asked for', () => {
  expect([pipe.transform(2574), pipe.transform(1.23456), pipe.transform(1.23456, 4)]).toEqual([
    '2,574',
    '1.235',
    '1.2346',
  ]);
});

it('shows nothing for nothing, and zero for zero', () => {
  expect([pipe.transform(null), pipe.transform(undefined), pipe.transform(0)]).toEqual([
    '',
    '',
    '0',
  ]);
});
