import { InputRule, inputRules, wrappingInputRule } from 'prosemirror-inputrules';
import type { MarkType } from 'prosemirror-model';
import type { Plugin } from 'prosemirror-state';
import { textSchema } from '#shared/report/text/schema';
import type { TextShape } from './text-shape';

const { marks, nodes } = textSchema;

/** Markdown as it is typed: list signs begin lists, stars and underscores style words. */
export function markdownTyping(shape: TextShape): Plugin {
  return inputRules({ rules: shape === 'one' ? STYLE_RULES : [...STYLE_RULES, ...LIST_RULES] });
}

const LIST_RULES = [
  wrappingInputRule(/^\s*[-*]\s$/u, nodes.bulletList),
  wrappingInputRule(/^\s*1[.)]\s$/u, nodes.orderedList),
];

const STYLE_RULES = [
  styleRule(/(?<![*\w])\*\*([^*\s]|[^*\s][^*]{0,300}[^*\s])\*\*$/u, 2, marks.strong),
  styleRule(/(?<![*\w])\*([^*\s]|[^*\s][^*]{0,300}[^*\s])\*$/u, 1, marks.em),
  styleRule(/(?<![_\w])_([^_\s]|[^_\s][^_]{0,300}[^_\s])_$/u, 1, marks.em),
];

/** The last sign that was typed is not in the document yet; those before it are. */
function styleRule(pattern: RegExp, signs: number, mark: MarkType): InputRule {
  return new InputRule(pattern, (state, match, start, end) => {
    const innerEnd = start + signs + (match[1]?.length ?? 0);
    return state.tr
      .delete(innerEnd, end)
      .delete(start, start + signs)
      .addMark(start, innerEnd - signs, mark.create())
      .removeStoredMark(mark);
  });
}
