import type { TableStyle } from '#shared/house-style';

/** The marker of the n-th note of a table, counted from 0: a, b … or *, † … or 1, 2 …. */
export function footnoteMarker(position: number, style: TableStyle): string {
  switch (style.footnoteMarkers) {
    case 'letters':
      return letters(position);
    case 'symbols':
      return symbols(position, style.footnoteSymbols);
    case 'numbers':
      return String(position + 1);
  }
}

function letters(position: number): string {
  const letter = String.fromCharCode(97 + (position % 26));
  return letter.repeat(Math.floor(position / 26) + 1);
}

function symbols(position: number, all: readonly string[]): string {
  const symbol = all[position % all.length] ?? '';
  return symbol.repeat(Math.floor(position / all.length) + 1);
}
