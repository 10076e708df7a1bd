import type { GridPlace } from './counts-grid';

/**
 * Where a key leads from a cell that is typed in, or null when the key belongs to the text: up,
 * down and Enter go by rows; left and right leave a text only at its ends.
 */
export function arrivalOf(event: KeyboardEvent, place: GridPlace): GridPlace | null {
  if (event.altKey || event.ctrlKey || event.metaKey) return null;
  const { row, column } = place;
  const caret = caretOf(event.target as HTMLInputElement);
  switch (event.key) {
    case 'ArrowUp':
      return { row: row - 1, column };
    case 'ArrowDown':
    case 'Enter':
      return { row: row + 1, column };
    case 'ArrowLeft':
      return caret.atStart ? { row, column: column - 1 } : null;
    case 'ArrowRight':
      return caret.atEnd ? { row, column: column + 1 } : null;
    default:
      return null;
  }
}

function caretOf(cell: HTMLInputElement): { atStart: boolean; atEnd: boolean } {
  return {
    atStart: cell.selectionStart === 0,
    atEnd: cell.selectionEnd === cell.value.length,
  };
}
