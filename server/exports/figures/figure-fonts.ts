import { existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { create, type Font } from 'fontkit';
import { woffToTtf } from './woff-to-ttf';

/** The family that figures are drawn in; its widths are those of the advance table. */
export const FIGURE_FONT = 'IBM Plex Sans';

/** The fonts of figures, unpacked once into the directory. */
export interface FigureFonts {
  readonly files: readonly string[];
  /** Whether the fonts have a shape for every character of a text. */
  readonly cover: (text: string) => boolean;
}

/** Opens the fonts, unpacking them first where that has not been done. */
export function openFigureFonts(directory: string): FigureFonts {
  const files = WEIGHTS.map((weight) => unpackedFont(weight, directory));
  const regular = create(readFileSync(files[0] as string)) as Font;
  return {
    files,
    cover: (text) => Array.from(text).every((character) => hasShape(regular, character)),
  };
}

const WEIGHTS = ['Regular', 'SemiBold'] as const;

function unpackedFont(weight: (typeof WEIGHTS)[number], directory: string): string {
  const path = join(directory, `IBMPlexSans-${weight}.ttf`);
  if (existsSync(path)) return path;
  mkdirSync(directory, { recursive: true });
  const packed = `@ibm/plex-sans/fonts/complete/woff/IBMPlexSans-${weight}.woff`;
  const font = woffToTtf(readFileSync(createRequire(import.meta.url).resolve(packed)));
  // Renamed into place, so that another process never reads half a font.
  const unfinished = `${path}.${String(process.pid)}`;
  writeFileSync(unfinished, font);
  renameSync(unfinished, path);
  return path;
}

function hasShape(font: Font, character: string): boolean {
  return font.hasGlyphForCodePoint(character.codePointAt(0) ?? 0);
}
