import type { ListElement } from '#shared/layout';
import { expect, it } from 'vitest';
import { nestedList } from './nested-list';

function item(text: string, depth: number, ordered = false) {
  return { depth, ordered, runs: [{ text }] };
}

function outline(items: ListElement['items']): unknown {
  const list = nestedList({ kind: 'list', blockId: 'b', ordered: false, items });
  const texts = (each: typeof list): unknown =>
    each.items.map(({ runs, inner }) => [runs[0]!.text, ...(inner ? [texts(inner)] : [])]);
  return texts(list);
}

it('keeps a flat list flat', () => {
  expect(outline([item('a', 0), item('b', 0)])).toEqual([['a'], ['b']]);
});

it('puts deeper items into the item before them', () => {
  expect(outline([item('a', 0), item('a1', 1), item('a2', 1), item('b', 0)])).toEqual([
    ['a', [['a1'], ['a2']]],
    ['b'],
  ]);
});

it('counts a skipped depth as one', () => {
  expect(outline([item('a', 0), item('deep', 3)])).toEqual([['a', [['deep']]]]);
});

it('keeps an item that lies less deep than the first', () => {
  expect(outline([item('a', 1), item('b', 0)])).toEqual([['a'], ['b']]);
});

it('says whether an inner list is numbered', () => {
  const list = nestedList({
    kind: 'list',
    blockId: 'b',
    ordered: false,
    items: [item('a', 0), item('one', 1, true)],
  });
  expect(list.items[0]!.inner!.ordered).toBe(true);
});

it('survives an empty list', () => {
  expect(outline([])).toEqual([]);
});
