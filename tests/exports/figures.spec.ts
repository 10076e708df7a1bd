import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { create, type Font } from 'fontkit';
import { beforeAll, describe, expect, it } from 'vitest';
import type { FigureElement } from '#shared/layout';
import { figureSvg } from '../../server/exports/figures/draw-figure';
import { openFigureFonts } from '../../server/exports/figures/figure-fonts';
import { figurePicture, type FigurePicture } from '../../server/exports/figures/figure-picture';
import { printAppearance } from '../../server/exports/figures/print-appearance';
import { elementsNamed, parseXml, textIn } from '../builders/xml-tree';
import { sampleRequest, TEST_FONTS } from './sample-request';

const { report, houseStyle } = sampleRequest();
const [first] = report.elements.filter((element) => element.kind === 'figure') as [FigureElement];
const ROOM = 160;

let svg: string;
let picture: FigurePicture;

beforeAll(async () => {
  svg = await figureSvg(first.figure, printAppearance(first.figure, houseStyle.figure, ROOM));
  picture = figurePicture(svg, openFigureFonts(TEST_FONTS), houseStyle.figure.dotsPerInch);
}, 60_000);

describe('a figure for print', () => {
  it('prints the numbers that the table prints, and the people behind each bar', () => {
    const texts = elementsNamed(parseXml(svg), 'text').map(textIn);
    for (const bar of first.figure.bars) {
      expect(texts).toContain(bar.valueText);
      expect(texts).toContain(bar.totalText);
    }
  });

  it('is no wider than the text, and as sharp as the house style says', () => {
    expect(picture.width).toBe(Math.floor((ROOM * 96) / 25.4));
    const png = Buffer.from(picture.png);
    expect(png.readUInt32BE(16)).toBe(Math.round((picture.width * 300) / 96));
  });

  it('has type of the size that the house style says', () => {
    const sizes = elementsNamed(parseXml(svg), 'text').map(
      ({ attributes }) => attributes['font-size'],
    );
    const eightPoints = `${(8 * 96) / 72}px`;
    expect(new Set(sizes)).toEqual(new Set([eightPoints]));
  });

  it('looks the same with any fonts: its text is outlines', () => {
    expect(picture.svg).not.toContain('<text');
    expect(picture.svg.length).toBeGreaterThan(svg.length);
  });
});

describe('the fonts of figures', () => {
  it('are the packed ones, table by table', () => {
    const packed = '@ibm/plex-sans/fonts/complete/woff/IBMPlexSans-Regular.woff';
    const path = createRequire(import.meta.url).resolve(packed);
    const [unpacked, original] = [openFigureFonts(TEST_FONTS).files[0]!, path].map(
      (file) => create(readFileSync(file)) as Font,
    ) as [Font, Font];
    expect(unpacked.familyName).toBe('IBM Plex Sans');
    expect(unpacked.numGlyphs).toBe(original.numGlyphs);
    const advance = (font: Font): number => font.layout('Over 6 h ≥ 20.9%').advanceWidth;
    expect(advance(unpacked)).toBe(advance(original));
  });

  it('know what they have no shape for', () => {
    const { cover } = openFigureFonts(TEST_FONTS);
    expect(cover('Over 6 h ≥ 20.9% − Größe')).toBe(true);
    expect(cover('מטבח')).toBe(false);
    expect(cover('🧼')).toBe(false);
  });
});
