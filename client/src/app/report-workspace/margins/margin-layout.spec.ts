import { describe, expect, it } from 'vitest';
import { placeNotes } from './margin-layout';

const note = (wanted: number, height: number, active = false) => ({ wanted, height, active });
const tops = (...notes: ReturnType<typeof note>[]) => placeNotes(notes).map(({ top }) => top);

describe('notes of the margin', () => {
  it('stand at their lines when there is room', () => {
    expect(placeNotes([note(10, 40), note(100, 40)])).toEqual([
      { top: 10, rise: 0 },
      { top: 100, rise: 0 },
    ]);
  });

  it('push down, never overlap', () => {
    expect(tops(note(10, 40), note(20, 30), note(30, 30))).toEqual([10, 64, 108]);
  });

  it('say how far below their line they stand', () => {
    expect(placeNotes([note(10, 40), note(20, 30)])[1]).toEqual({ top: 64, rise: 44 });
  });

  it('let the active note win its line, those before it moving up', () => {
    expect(tops(note(200, 40), note(210, 30, true), note(220, 30))).toEqual([156, 210, 254]);
  });

  it('stay on the page: without room above, the active note stays pushed down', () => {
    expect(tops(note(0, 40), note(10, 30, true))).toEqual([0, 54]);
  });
});
