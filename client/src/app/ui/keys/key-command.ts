/**
 * Something a key does. `key` is written as a person reads it: `?`, `/`, `A`, `Alt Up`,
 * `Ctrl Enter`, `Esc`, or two strokes after each other: `G then D`.
 */
export interface KeyCommand {
  readonly key: string;
  /** What it does, as in "Ask a query". */
  readonly says: string;
  /** Heading in the list of all keys. */
  readonly group: string;
  readonly run: (event: KeyboardEvent) => void;
  /** Shown in the strip at the foot; commands with the same words share one entry. */
  readonly inStrip?: boolean;
  /** Acts only while it is true. */
  readonly active?: () => boolean;
  /** Acts only while the focus is inside. */
  readonly within?: () => Element | null | undefined;
}

/** One stroke: a key with its modifiers. */
interface Stroke {
  readonly key: string;
  readonly alt: boolean;
  readonly control: boolean;
}

const SPOKEN_KEYS: Readonly<Record<string, string>> = {
  up: 'arrowup',
  down: 'arrowdown',
  left: 'arrowleft',
  right: 'arrowright',
  esc: 'escape',
  space: ' ',
};

/** The strokes that a command waits for, one after the other. */
export function strokesOf(key: string): readonly Stroke[] {
  return key.split(' then ').map(strokeOf);
}

/** Whether an event is this stroke. Shift is left to the character that it makes. */
export function isStroke(event: KeyboardEvent, stroke: Stroke): boolean {
  return (
    event.key.toLowerCase() === stroke.key &&
    event.altKey === stroke.alt &&
    (event.ctrlKey || event.metaKey) === stroke.control
  );
}

/** Whether the stroke is a bare printable character, which people can switch off (WCAG 2.1.4). */
export function isSingleKey(key: string): boolean {
  return strokesOf(key).some((stroke) => stroke.key.length === 1 && !stroke.alt && !stroke.control);
}

function strokeOf(text: string): Stroke {
  const parts = text.toLowerCase().split(' ');
  const named = parts.at(-1) ?? '';
  return {
    key: SPOKEN_KEYS[named] ?? named,
    alt: parts.includes('alt'),
    control: parts.includes('ctrl'),
  };
}
