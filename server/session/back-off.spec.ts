import { describe, expect, it } from 'vitest';
import { createBackOff } from './back-off';

function backOffAt(start: number) {
  let seconds = start;
  const backOff = createBackOff({ now: () => new Date(seconds * 1000) });
  return {
    ...backOff,
    wait: (more: number): void => void (seconds += more),
    fail: (times: number): void => {
      for (let time = 0; time < times; time += 1) backOff.recordFailure('ada');
    },
  };
}

describe('the back-off', () => {
  it('lets four failures pass, then doubles the wait up to five minutes', () => {
    const waits = [4, 5, 6, 7, 8, 12, 13, 40].map((times) => {
      const backOff = backOffAt(1000);
      backOff.fail(times);
      return backOff.secondsToWait('ada');
    });
    expect(waits).toEqual([0, 2, 4, 8, 16, 256, 300, 300]);
  });

  it('counts down, and counts on from there', () => {
    const backOff = backOffAt(1000);
    backOff.fail(6);
    backOff.wait(3);
    expect(backOff.secondsToWait('ada')).toBe(1);
    backOff.wait(1);
    expect(backOff.secondsToWait('ada')).toBe(0);
    backOff.fail(1);
    expect(backOff.secondsToWait('ada')).toBe(8);
  });

  it('forgets on success and after an hour, and keeps names apart', () => {
    const backOff = backOffAt(1000);
    backOff.fail(6);
    expect(backOff.secondsToWait('bea')).toBe(0);
    backOff.forget('ada');
    expect(backOff.secondsToWait('ada')).toBe(0);
    backOff.fail(6);
    backOff.wait(3601);
    backOff.fail(1);
    expect(backOff.secondsToWait('ada')).toBe(0);
  });

  it('remembers at most ten thousand names, the latest ones', () => {
    const backOff = backOffAt(1000);
    backOff.fail(6);
    for (let name = 0; name < 10_000; name += 1) backOff.recordFailure(`name ${String(name)}`);
    expect(backOff.secondsToWait('ada')).toBe(0);
  });
});
