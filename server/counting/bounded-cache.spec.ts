import { describe, expect, it } from 'vitest';
import { createBoundedCache } from './bounded-cache';

describe('createBoundedCache', () => {
  it('loads once, also for those who ask while it loads', async () => {
    const { cache, loads, ask } = counting(100);
    await Promise.all([ask('a', 10), ask('a', 10)]);
    await ask('a', 10);
    expect(loads).toEqual(['a']);
    expect(cache.keptBytes()).toBe(10);
  });

  it('lets go of what was used longest ago', async () => {
    const { loads, ask } = counting(30);
    for (const key of ['a', 'b', 'c', 'a', 'd', 'a', 'b']) await ask(key, 10);
    expect(loads).toEqual(['a', 'b', 'c', 'd', 'b']);
  });

  it('gives what is too large without keeping it or losing the rest', async () => {
    const { cache, loads, ask } = counting(30);
    await ask('a', 10);
    expect(await ask('huge', 31)).toBe(31);
    await ask('huge', 31);
    await ask('a', 10);
    expect(loads).toEqual(['a', 'huge', 'huge']);
    expect(cache.keptBytes()).toBe(10);
  });

  it('tries again after a load that failed', async () => {
    const { cache, ask } = counting(30);
    await expect(cache.get('a', () => Promise.reject(new Error('gone')))).rejects.toThrow('gone');
    expect(await ask('a', 5)).toBe(5);
  });
});

function counting(bytes: number) {
  const cache = createBoundedCache<number>(bytes, (value) => value);
  const loads: string[] = [];
  const ask = (key: string, value: number): Promise<number> =>
    cache.get(key, () => {
      loads.push(key);
      return Promise.resolve(value);
    });
  return { cache, loads, ask };
}
