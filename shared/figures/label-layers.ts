import type { ChartBar } from '#shared/layout';
import { barBox } from './bar-geometry';
import { GAP, scaled } from './figure-frame';
import { heightOf, pixels } from './spec-parts';
import type { FigureLayer, SpecParts } from './spec-parts';

/** All words and numbers in and around the plot, apart from the ticks of the value axis. */
export function labelLayers(parts: SpecParts): readonly FigureLayer[] {
  const { ink, secondInk } = parts.colours;
  return [
    texts(parts, { color: ink, align: 'center', baseline: 'bottom' }, valueLabels(parts)),
    texts(parts, { color: secondInk, align: 'center', baseline: 'top' }, counts(parts)),
    texts(parts, { color: secondInk, align: 'right', baseline: 'top' }, countsHead(parts)),
    texts(parts, { color: ink, align: 'center', baseline: 'top' }, categoryLabels(parts)),
    texts(parts, { color: secondInk, align: 'center', baseline: 'top' }, categoryTitle(parts)),
    texts(parts, { color: secondInk, align: 'left', baseline: 'top' }, valueTitle(parts)),
  ];
}

/** Text in lines at a place of the plot, in pixels. */
interface PlacedText {
  readonly atX: number;
  readonly atY: number;
  readonly text: string | readonly string[];
}

interface TextLook {
  readonly color: string;
  readonly align: 'left' | 'center' | 'right';
  readonly baseline: 'top' | 'middle' | 'bottom';
}

/** A layer of placed text; its own look apart, the type is that of the figure. */
export function texts(
  { frame }: SpecParts,
  look: TextLook,
  values: readonly PlacedText[],
): FigureLayer {
  return {
    data: { values: [...values] },
    mark: { type: 'text', lineHeight: frame.lineHeight, clip: false, ...look },
    encoding: { x: pixels('atX'), y: pixels('atY'), text: { field: 'text', type: 'nominal' } },
  };
}

/** Values over the whiskers; a bar without a value says so at its foot, whatever is printed. */
function valueLabels(parts: SpecParts): readonly PlacedText[] {
  const height = heightOf(parts);
  return parts.figure.bars
    .filter((bar) => bar.value === null || parts.frame.printsValues)
    .map((bar) => {
      const top = scaled(bar.upper ?? bar.value ?? 0, parts.figure) ?? 0;
      return { ...barFoot(bar, parts), atY: height(top) - 4, text: bar.valueText };
    });
}

function counts(parts: SpecParts): readonly PlacedText[] {
  if (!parts.frame.countsUnderBars) return [];
  return parts.figure.bars.map((bar) => ({ ...barFoot(bar, parts), text: bar.totalText }));
}

function countsHead({ frame, figure }: SpecParts): readonly PlacedText[] {
  if (!frame.countsUnderBars || figure.bars.length === 0) return [];
  return [{ atX: -GAP, atY: frame.plotHeight + GAP, text: 'n' }];
}

function barFoot(bar: ChartBar, parts: SpecParts): { readonly atX: number; readonly atY: number } {
  const { figure, frame } = parts;
  const { left, right } = barBox(bar, figure, frame.geometry, () => 0);
  return { atX: (left + right) / 2, atY: frame.plotHeight + GAP };
}

function categoryLabels({ frame }: SpecParts): readonly PlacedText[] {
  const { categoryWidth } = frame.geometry;
  return frame.categoryLines.map((text, index) => ({
    atX: (index + 0.5) * categoryWidth,
    atY: belowCounts(frame),
    text,
  }));
}

function categoryTitle({ frame }: SpecParts): readonly PlacedText[] {
  const lines = Math.max(1, ...frame.categoryLines.map((text) => text.length));
  const atY = belowCounts(frame) + lines * frame.lineHeight + GAP / 2;
  return [{ atX: frame.geometry.plotWidth / 2, atY, text: frame.categoryTitle }];
}

function belowCounts(frame: SpecParts['frame']): number {
  return frame.plotHeight + GAP + (frame.countsUnderBars ? frame.lineHeight : 0);
}

/** Stands over the axis, level with the left edge of the picture. */
function valueTitle({ frame }: SpecParts): readonly PlacedText[] {
  const atY = -(frame.valueTitle.length + 0.5) * frame.lineHeight;
  return [{ atX: -frame.padding.left, atY, text: frame.valueTitle }];
}
