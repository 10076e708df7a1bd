import * as fontkit from 'fontkit';
import { describe, expect, it } from 'vitest';
import { GLYPH_ADVANCES } from './glyph-advances';
import { textWidth, vegaTextWidth } from './text-width';
import { wrapText } from './wrap-text';

const FOLDER = 'node_modules/@ibm/plex-sans/fonts/complete/woff';
const FILES = { regular: 'IBMPlexSans-Regular', semibold: 'IBMPlexSans-SemiBold' } as const;

describe('the advance table', () => {
  it.each(['regular', 'semibold'] as const)('is that of the %s font file', (weight) => {
    const font = fontkit.openSync(`${FOLDER}/${FILES[weight]}.woff`) as fontkit.Font;
    const wrong = GLYPH_ADVANCES[weight].flatMap(([advance, characters]) =>
      Array.from(characters).filter((character) => {
        const glyph = font.glyphForCodePoint(character.codePointAt(0) ?? 0);
        return (glyph.advanceWidth * 1000) / font.unitsPerEm !== advance;
      }),
    );
    expect(wrong).toEqual([]);
  });
});

describe('textWidth', () => {
  it('adds the advances, scaled to the type size', () => {
    expect(textWidth('10', { sizeInPixels: 12, weight: 'regular' })).toBeCloseTo(14.4, 10);
  });

  it('gives unknown characters room', () => {
    expect(textWidth('漢', { sizeInPixels: 10, weight: 'regular' })).toBe(10);
  });
});

describe('vegaTextWidth', () => {
  it('takes the widest of several lines', () => {
    expect(vegaTextWidth({ fontSize: 10 }, ['00', '0'])).toBeCloseTo(12, 10);
  });
});

describe('wrapText', () => {
  const type = { sizeInPixels: 12, weight: 'regular' } as const;

  it('breaks at blanks and loses nothing', () => {
    const lines = wrapText('Sometimes, when asked by a colleague', 120, type);
    expect(lines.length).toBeGreaterThan(1);
    expect(lines.join(' ')).toBe('Sometimes, when asked by a colleague');
  });

  it('keeps a number and its unit together', () => {
    expect(wrapText('Under 2 h', 40, type)).toEqual(['Under', '2 h']);
  });

  it('gives a word that is too wide its own line', () => {
    expect(wrapText('a incomprehensibilities b', 50, type)).toEqual([
      'a',
      'incomprehensibilities',
      'b',
    ]);
  });
});
