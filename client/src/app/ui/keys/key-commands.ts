import { computed, DestroyRef, DOCUMENT, inject, Injectable, signal } from '@angular/core';
import { remembered } from '../remembered';
import { isSingleKey, isStroke, type KeyCommand, strokesOf } from './key-command';

const SECOND_STROKE_MILLISECONDS = 1500;
const TEXT_CONTROLS =
  'input, textarea, select, [contenteditable=true], [role=textbox], [role=combobox]';

/** The keys of the page in view: runs them, lists them, lets a person switch single keys off. */
@Injectable({ providedIn: 'root' })
export class KeyCommands {
  private readonly document = inject(DOCUMENT);
  private readonly registered = signal<readonly (readonly KeyCommand[])[]>([]);
  private firstStroke: { readonly key: string; readonly at: number } | null = null;

  readonly singleKeysOn = remembered('evenhand.single-keys', true, (value) => value !== false);
  readonly all = computed(() => this.registered().flat());
  readonly strip = computed(() => {
    const shown = this.all().filter((command) => command.inStrip === true);
    return this.singleKeysOn() ? shown : shown.filter((command) => !isSingleKey(command.key));
  });

  constructor() {
    const listen = (event: KeyboardEvent): void => {
      this.press(event);
    };
    this.document.addEventListener('keydown', listen);
    inject(DestroyRef).onDestroy(() => {
      this.document.removeEventListener('keydown', listen);
    });
  }

  /** Adds commands; the later added win. Gives back how to take them away. */
  add(commands: readonly KeyCommand[]): () => void {
    this.registered.update((lists) => [...lists, commands]);
    return () => {
      this.registered.update((lists) => lists.filter((list) => list !== commands));
    };
  }

  private press(event: KeyboardEvent): void {
    if (event.defaultPrevented || event.isComposing || isModifier(event)) return;
    const first = this.takeFirstStroke(event.timeStamp);
    const command = this.all().findLast((each) => this.matches(each, event, first));
    if (command !== undefined) {
      event.preventDefault();
      command.run(event);
    } else if (this.startsCommand(event)) {
      this.firstStroke = { key: event.key.toLowerCase(), at: event.timeStamp };
    }
  }

  private takeFirstStroke(now: number): string | null {
    const first = this.firstStroke;
    this.firstStroke = null;
    return first !== null && now - first.at < SECOND_STROKE_MILLISECONDS ? first.key : null;
  }

  private matches(command: KeyCommand, event: KeyboardEvent, first: string | null): boolean {
    if (!this.mayAct(command, event)) return false;
    const [one, two] = strokesOf(command.key);
    if (one === undefined) return false;
    if (two === undefined) return first === null && isStroke(event, one);
    return first === one.key && isStroke(event, two);
  }

  private startsCommand(event: KeyboardEvent): boolean {
    return this.all().some((command) => {
      const [one, two] = strokesOf(command.key);
      return (
        one !== undefined &&
        two !== undefined &&
        isStroke(event, one) &&
        this.mayAct(command, event)
      );
    });
  }

  private mayAct(command: KeyCommand, event: KeyboardEvent): boolean {
    const target = event.target as Element | null;
    if (isSingleKey(command.key) && (!this.singleKeysOn() || takesText(target))) return false;
    if (target?.closest('[role=dialog], dialog') && command.within === undefined) return false;
    if (command.within !== undefined && command.within()?.contains(target) !== true) return false;
    return command.active?.() ?? true;
  }
}

/** Adds commands for as long as the component that calls this lives. */
export function keyCommands(commands: readonly KeyCommand[]): void {
  inject(DestroyRef).onDestroy(inject(KeyCommands).add(commands));
}

function isModifier(event: KeyboardEvent): boolean {
  return ['Shift', 'Control', 'Alt', 'Meta'].includes(event.key);
}

function takesText(target: Element | null): boolean {
  return target !== null && target.closest(TEXT_CONTROLS) !== null;
}
