import { DestroyRef, inject, Injectable } from '@angular/core';

/** A note of the right margin, and the height on the page of what it speaks of. */
export interface PlacedNote {
  readonly element: HTMLElement;
  /** The row of its block; `top` of the note counts from there. */
  readonly row: HTMLElement;
  /** Where the line is that the note speaks of, below the top of the row. */
  readonly anchor: () => number;
  readonly active: () => boolean;
}

/** Where a note stands, and how far below its line. */
export interface NotePlace {
  readonly top: number;
  readonly rise: number;
}

interface MeasuredNote {
  readonly wanted: number;
  readonly height: number;
  readonly active: boolean;
}

const GAP = 14;

/**
 * Places notes at the height of their lines, in order: a note that would cover the one before is
 * pushed down. The active note wins its line; those before it move up as far as they must.
 */
export function placeNotes(notes: readonly MeasuredNote[]): readonly NotePlace[] {
  const tops = pushDown(notes);
  const active = notes.findIndex((note) => note.active);
  if (active !== -1) pushUp(notes, tops, active);
  return notes.map(({ wanted }, index) => {
    const top = tops[index] ?? wanted;
    return { top, rise: top - wanted };
  });
}

function pushDown(notes: readonly MeasuredNote[]): number[] {
  const tops: number[] = [];
  let free = Number.NEGATIVE_INFINITY;
  for (const { wanted, height } of notes) {
    const top = Math.max(wanted, free);
    tops.push(top);
    free = top + height + GAP;
  }
  return tops;
}

/** Notes above the active one make room, but not beyond the top of the page. */
function pushUp(notes: readonly MeasuredNote[], tops: number[], active: number): void {
  let top = notes[active]?.wanted ?? 0;
  const room = notes.slice(0, active).reduce((sum, { height }) => sum + height + GAP, 0);
  if (top < room) return;
  tops[active] = top;
  for (let index = active - 1; index >= 0; index -= 1) {
    const lowest = top - GAP - (notes[index]?.height ?? 0);
    top = Math.min(tops[index] ?? 0, lowest);
    tops[index] = top;
  }
  let free = (tops[active] ?? 0) + (notes[active]?.height ?? 0) + GAP;
  for (let index = active + 1; index < notes.length; index += 1) {
    const settled = Math.max(notes[index]?.wanted ?? 0, free);
    tops[index] = settled;
    free = settled + (notes[index]?.height ?? 0) + GAP;
  }
}

/** Keeps the notes of the right margin beside their lines whenever the page changes its shape. */
@Injectable()
export class MarginLayout {
  private readonly notes = new Set<PlacedNote>();
  private readonly observer = new ResizeObserver(() => {
    this.schedule();
  });
  private frame = 0;

  constructor() {
    inject(DestroyRef).onDestroy(() => {
      this.observer.disconnect();
      cancelAnimationFrame(this.frame);
    });
  }

  /** Watches the page; everything on it that grows or shrinks moves the notes. */
  watch(page: HTMLElement): void {
    this.observer.observe(page);
  }

  add(note: PlacedNote): () => void {
    this.notes.add(note);
    this.observer.observe(note.element);
    this.schedule();
    return () => {
      this.notes.delete(note);
      this.observer.unobserve(note.element);
      this.schedule();
    };
  }

  /** Places the notes before the next paint. */
  schedule(): void {
    cancelAnimationFrame(this.frame);
    this.frame = requestAnimationFrame(() => {
      this.place();
    });
  }

  private place(): void {
    const measured = [...this.notes].map((note) => {
      const rowTop = note.row.offsetTop;
      const wanted = rowTop + note.anchor();
      return { note, rowTop, wanted, height: note.element.offsetHeight, active: note.active() };
    });
    const inOrder = measured.toSorted((one, other) => one.wanted - other.wanted);
    const places = placeNotes(inOrder);
    for (const [index, { note, rowTop }] of inOrder.entries()) {
      const place = places[index];
      if (place === undefined) continue;
      const top = `${place.top - rowTop}px`;
      if (note.element.style.top === top) continue;
      note.element.style.top = top;
      note.element.style.setProperty('--rise', `${Math.max(0, place.rise)}px`);
    }
  }
}
