import {
  AlignmentType,
  LevelFormat,
  Paragraph,
  type ILevelsOptions,
  type INumberingOptions,
} from 'docx';
import type { ListElement, ListItem } from '#shared/layout';
import type { DocumentContext } from './document-context';
import { PARAGRAPH_STYLES } from './document-styles';
import { drawRuns } from './text-runs';

/** Word has nine levels of a list; deeper items stand on the last. */
const LEVELS = 9;

/** Each list that begins, nested ones too, is an instance of one of these two definitions. */
export function listNumbering(): INumberingOptions {
  const levels = Array.from({ length: LEVELS }, (_, level) => level);
  return {
    config: [
      { reference: 'bullets', levels: levels.map(bulletLevel) },
      { reference: 'numbers', levels: levels.map(numberLevel) },
    ],
  };
}

/** The items of a list as paragraphs. */
export function drawList(element: ListElement, context: DocumentContext): readonly Paragraph[] {
  const open: OpenList[] = [];
  return element.items.map((item) => {
    const depth = Math.min(item.depth, LEVELS - 1);
    const { instance } = listAt(depth, item, open, context);
    return new Paragraph({
      style: item.ordered ? PARAGRAPH_STYLES.numberList : PARAGRAPH_STYLES.bulletList,
      numbering: { reference: item.ordered ? 'numbers' : 'bullets', level: depth, instance },
      children: [...drawRuns(item.runs, context.bookmarks)],
    });
  });
}

interface OpenList {
  readonly ordered: boolean;
  readonly instance: number;
}

/** The list that an item belongs to: the open one at its depth, or a new one. */
function listAt(
  depth: number,
  { ordered }: ListItem,
  open: OpenList[],
  { nextList }: DocumentContext,
): OpenList {
  open.length = Math.min(open.length, depth + 1);
  const present = open[depth];
  if (present?.ordered === ordered) return present;
  const list = { ordered, instance: nextList() };
  open[depth] = list;
  return list;
}

function bulletLevel(level: number): ILevelsOptions {
  return { ...shapeOf(level), format: LevelFormat.BULLET, text: level % 2 === 0 ? '•' : '–' };
}

function numberLevel(level: number): ILevelsOptions {
  const format = level % 2 === 0 ? LevelFormat.DECIMAL : LevelFormat.LOWER_LETTER;
  return { ...shapeOf(level), format, text: `%${String(level + 1)}.`, start: 1 };
}

function shapeOf(level: number): Pick<ILevelsOptions, 'level' | 'alignment' | 'style'> {
  const indent = { left: 360 * (level + 1), hanging: 360 };
  return { level, alignment: AlignmentType.LEFT, style: { paragraph: { indent } } };
}
