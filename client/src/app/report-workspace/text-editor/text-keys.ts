import { baseKeymap, chainCommands, toggleMark } from 'prosemirror-commands';
import { redo, undo } from 'prosemirror-history';
import { keymap } from 'prosemirror-keymap';
import { splitListItem } from 'prosemirror-schema-list';
import type { Command, Plugin } from 'prosemirror-state';
import { textSchema } from '#shared/report/text/schema';
import { deeper, lineBreak, shallower } from './text-commands';
import type { TextShape } from './text-shape';

const { marks, nodes } = textSchema;

/** The keys of a text; `own` are those of the page and come first. Tab leaves, as everywhere. */
export function textKeys(shape: TextShape, own: Readonly<Record<string, Command>>): Plugin[] {
  const shaped = shape === 'one' ? LINE_KEYS : PARAGRAPH_KEYS;
  return [keymap({ ...own }), keymap({ ...MARK_KEYS, ...shaped }), keymap(baseKeymap)];
}

const nothing: Command = () => true;

const MARK_KEYS: Readonly<Record<string, Command>> = {
  'Mod-z': undo,
  'Mod-y': redo,
  'Mod-Shift-z': redo,
  'Mod-b': toggleMark(marks.strong),
  'Mod-i': toggleMark(marks.em),
  'Mod-.': toggleMark(marks.superscript),
  'Mod-,': toggleMark(marks.subscript),
};

const LINE_KEYS: Readonly<Record<string, Command>> = {
  'Shift-Enter': nothing,
  Enter: nothing,
};

const PARAGRAPH_KEYS: Readonly<Record<string, Command>> = {
  'Shift-Enter': lineBreak,
  Enter: chainCommands(splitListItem(nodes.listItem), shallowerOnEmpty()),
  'Mod-]': deeper,
  'Mod-[': shallower,
};

/** Enter in an empty item ends the list. */
function shallowerOnEmpty(): Command {
  return (state, dispatch) =>
    state.selection.$from.parent.content.size === 0 && shallower(state, dispatch);
}
