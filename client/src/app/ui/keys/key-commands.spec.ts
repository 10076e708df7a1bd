import { TestBed } from '@angular/core/testing';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { isSingleKey, type KeyCommand } from './key-command';
import { KeyCommands } from './key-commands';

let commands: KeyCommands;
let elements: HTMLElement[] = [];

beforeEach(() => {
  localStorage.clear();
  commands = TestBed.inject(KeyCommands);
});

afterEach(() => {
  for (const element of elements) element.remove();
  elements = [];
});

function command(key: string, more: Partial<KeyCommand> = {}) {
  const run = vi.fn();
  commands.add([{ key, says: 'Does it', group: 'Test', run, ...more }]);
  return run;
}

function press(key: string, init: KeyboardEventInit = {}, on: Element = document.body) {
  const event = new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true, ...init });
  on.dispatchEvent(event);
  return event;
}

function element(html: string): HTMLElement {
  const holder = document.createElement('div');
  holder.innerHTML = html;
  document.body.append(holder);
  elements.push(holder);
  return holder.firstElementChild as HTMLElement;
}

describe('a stroke', () => {
  it('runs its command and keeps the key from the browser', () => {
    const run = command('/');
    expect(press('/').defaultPrevented).toBe(true);
    expect(run).toHaveBeenCalledOnce();
  });

  it('needs its modifiers, no fewer and no more', () => {
    const run = command('Alt Up');
    press('ArrowUp');
    press('ArrowUp', { altKey: true, ctrlKey: true });
    expect(run).not.toHaveBeenCalled();
    press('ArrowUp', { altKey: true });
    expect(run).toHaveBeenCalledOnce();
  });

  it('takes a letter whether or not it is a capital', () => {
    const run = command('A');
    press('a');
    press('A');
    expect(run).toHaveBeenCalledTimes(2);
  });

  it('goes to the command that was added last', () => {
    const first = command('X');
    const last = command('X');
    press('x');
    expect([first.mock.calls.length, last.mock.calls.length]).toEqual([0, 1]);
  });

  it('does nothing once its command was taken away', () => {
    const run = vi.fn();
    commands.add([{ key: 'X', says: 'Does it', group: 'Test', run }])();
    press('x');
    expect(run).not.toHaveBeenCalled();
  });

  it('is left alone when somebody handled it already', () => {
    const run = command('Esc');
    const button = element('<button></button>');
    button.addEventListener('keydown', (event) => {
      event.preventDefault();
    });
    press('Escape', {}, button);
    expect(run).not.toHaveBeenCalled();
  });
});

describe('two strokes', () => {
  it('run the command one after the other', () => {
    const run = command('G then D');
    press('g');
    press('d');
    expect(run).toHaveBeenCalledOnce();
  });

  it('do not run the command of the second alone', () => {
    const run = command('G then R');
    const single = command('R');
    press('g');
    press('r');
    expect([run.mock.calls.length, single.mock.calls.length]).toEqual([1, 0]);
  });

  it('lapse when another key comes between', () => {
    const run = command('G then D');
    press('g');
    press('x');
    press('d');
    expect(run).not.toHaveBeenCalled();
  });
});

describe('single keys', () => {
  it('never act while somebody types', () => {
    const run = command('A');
    for (const html of [
      '<input />',
      '<textarea></textarea>',
      '<select></select>',
      '<div contenteditable="true"></div>',
    ]) {
      press('a', {}, element(html));
    }
    expect(run).not.toHaveBeenCalled();
  });

  it('can be switched off, while keys with Ctrl or Alt still act', () => {
    const single = command('A');
    const chord = command('Ctrl Enter');
    commands.singleKeysOn.set(false);
    press('a');
    press('Enter', { ctrlKey: true });
    expect([single.mock.calls.length, chord.mock.calls.length]).toEqual([0, 1]);
  });

  it('stay off on the next visit', () => {
    commands.singleKeysOn.set(false);
    TestBed.resetTestingModule();
    expect(TestBed.inject(KeyCommands).singleKeysOn()).toBe(false);
  });

  it('leave the strip when they are off', () => {
    command('A', { inStrip: true });
    command('Alt Up', { inStrip: true });
    commands.singleKeysOn.set(false);
    expect(commands.strip().map(({ key }) => key)).toEqual(['Alt Up']);
  });

  it('are told from keys with modifiers and from named keys', () => {
    expect(['A', '?', 'G then D', 'Up', 'Alt Up', 'Ctrl Enter'].map(isSingleKey)).toEqual([
      true,
      true,
      true,
      false,
      false,
      false,
    ]);
  });
});

describe('where keys act', () => {
  it('only inside what the command names', () => {
    const row = element('<div><button></button></div>');
    const run = command('X', { within: () => row });
    press('x');
    expect(run).not.toHaveBeenCalled();
    press('x', {}, row.querySelector('button')!);
    expect(run).toHaveBeenCalledOnce();
  });

  it('not behind a dialog', () => {
    const run = command('X');
    press('x', {}, element('<div role="dialog"><button></button></div>').firstElementChild!);
    expect(run).not.toHaveBeenCalled();
  });

  it('only while the command is active', () => {
    const run = command('X', { active: () => false });
    press('x');
    expect(run).not.toHaveBeenCalled();
  });
});
