import { signal, type WritableSignal } from '@angular/core';

/**
 * A choice that this browser keeps. `read` turns what was kept (any JSON value, or null) into a
 * value; a browser that keeps nothing still works, for the visit.
 */
export function remembered<Value>(
  key: string,
  initial: Value,
  read: (kept: unknown) => Value,
): WritableSignal<Value> {
  const kept = keptValue(key);
  const choice = signal(kept === null ? initial : read(kept));
  return keeping(choice, key);
}

function keeping<Value>(choice: WritableSignal<Value>, key: string): WritableSignal<Value> {
  const set = choice.set.bind(choice);
  choice.set = (value) => {
    set(value);
    keepValue(key, value);
  };
  choice.update = (change) => {
    choice.set(change(choice()));
  };
  return choice;
}

function keptValue(key: string): unknown {
  try {
    const text = localStorage.getItem(key);
    return text === null ? null : (JSON.parse(text) as unknown);
  } catch {
    return null;
  }
}

function keepValue(key: string, value: unknown): void {
  try {
    localStorage.setItem(key, JSON.stringify(value));
  } catch {
    // Storage may be full or forbidden; the choice then lasts as long as the page.
  }
}
