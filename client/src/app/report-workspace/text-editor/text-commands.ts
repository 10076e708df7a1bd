import { setBlockType, toggleMark } from 'prosemirror-commands';
import type { Attrs, MarkType, NodeType, ResolvedPos } from 'prosemirror-model';
import { liftListItem, sinkListItem, wrapInList } from 'prosemirror-schema-list';
import type { Command, EditorState } from 'prosemirror-state';
import { DEEPEST_LIST, isAllowedLink, textSchema } from '#shared/report/text/schema';

const { marks, nodes } = textSchema;

/** What the buttons over a text do. */
export const TEXT_COMMANDS = {
  strong: toggleMark(marks.strong),
  em: toggleMark(marks.em),
  superscript: toggleMark(marks.superscript),
  subscript: toggleMark(marks.subscript),
  bulletList: toggleList(nodes.bulletList),
  orderedList: toggleList(nodes.orderedList),
} as const satisfies Readonly<Record<string, Command>>;

/** Name of a button over a text. */
export type TextCommandId = keyof typeof TEXT_COMMANDS;

/** Whether the style of a button holds where the cursor is. */
export function isOn(state: EditorState, id: TextCommandId): boolean {
  const mark = state.schema.marks[id];
  return mark === undefined ? listAround(state)?.name === id : hasMark(state, mark);
}

/** Puts a list item one level deeper, as long as a report can print it. */
export const deeper: Command = (state, dispatch) =>
  listDepth(state.selection.$from) < DEEPEST_LIST && sinkListItem(nodes.listItem)(state, dispatch);

/** Puts a list item one level up; the outermost becomes a paragraph. */
export const shallower: Command = liftListItem(nodes.listItem);

/** A line break within a paragraph. */
export const lineBreak: Command = (state, dispatch) => {
  dispatch?.(state.tr.replaceSelectionWith(nodes.hardBreak.create()).scrollIntoView());
  return true;
};

/** Puts an atom in the place of what is selected. */
export function insertAtom(type: 'boundValue' | 'crossReference', attrs: Attrs): Command {
  return (state, dispatch) => {
    dispatch?.(state.tr.replaceSelectionWith(nodes[type].create(attrs)).scrollIntoView());
    return true;
  };
}

/** Changes the selected atom. */
export function changeAtom(attrs: Attrs): Command {
  return (state, dispatch) => {
    const { from } = state.selection;
    const node = state.doc.nodeAt(from);
    if (node?.isAtom !== true) return false;
    dispatch?.(state.tr.setNodeMarkup(from, null, { ...node.attrs, ...attrs }));
    return true;
  };
}

/** Links the selected words; an empty address takes the link away. */
export function setLink(href: string): Command {
  return (state, dispatch) => {
    const { from, to, empty } = state.selection;
    if (empty || (href !== '' && !isAllowedLink(href))) return false;
    const tr = state.tr.removeMark(from, to, marks.link);
    dispatch?.(href === '' ? tr : tr.addMark(from, to, marks.link.create({ href })));
    return true;
  };
}

/** The link at the cursor, if any. */
export function linkAt(state: EditorState): string | null {
  const { $from } = state.selection;
  const found = [...$from.marks(), ...($from.nodeAfter?.marks ?? [])].find(
    (mark) => mark.type === marks.link,
  );
  return (found?.attrs.href as string | undefined) ?? null;
}

function toggleList(type: NodeType): Command {
  return (state, dispatch) => {
    const around = listAround(state);
    if (around === type) return shallower(state, dispatch);
    if (around !== null) return retypeList(type)(state, dispatch);
    return wrapInList(type)(state, dispatch) || setBlockType(nodes.paragraph)(state, dispatch);
  };
}

function retypeList(type: NodeType): Command {
  return (state, dispatch) => {
    const { $from } = state.selection;
    const depth = listDepthIndex($from);
    if (depth === null) return false;
    dispatch?.(state.tr.setNodeMarkup($from.before(depth), type));
    return true;
  };
}

function listAround(state: EditorState): NodeType | null {
  const { $from } = state.selection;
  const depth = listDepthIndex($from);
  return depth === null ? null : $from.node(depth).type;
}

function listDepthIndex($from: ResolvedPos): number | null {
  for (let depth = $from.depth; depth > 0; depth -= 1) {
    if (isList($from.node(depth).type)) return depth;
  }
  return null;
}

function listDepth($from: ResolvedPos): number {
  const depths = Array.from({ length: $from.depth + 1 }, (_, depth) => $from.node(depth).type);
  return depths.filter(isList).length;
}

function isList(type: NodeType): boolean {
  return type === nodes.bulletList || type === nodes.orderedList;
}

function hasMark(state: EditorState, mark: MarkType): boolean {
  const { from, to, empty, $from } = state.selection;
  if (empty) return mark.isInSet(state.storedMarks ?? $from.marks()) !== undefined;
  return state.doc.rangeHasMark(from, to, mark);
}
