import * as vega from 'vega';
import { compile } from 'vega-lite';
import type { TopLevelSpec } from 'vega-lite';
import { beforeAll, describe, expect, it } from 'vitest';
import type { GroupedBarFigure } from '#shared/layout';
import { screenAppearance } from './appearance';
import type { FigureAppearance } from './appearance';
import { groupedBarSpec } from './grouped-bar-spec';
import { sampleFigure } from './testing/sample-figure';
import { vegaTextWidth } from './text-width';

const ECZEMA = sampleFigure(
  ['None', 'Under 2 h', 'Over 6 h'],
  ['Hospital ward', 'Kitchen'],
  [
    [
      { events: 11, total: 236, lower: 0.026, upper: 0.082 },
      { events: 4, total: 118, lower: 0.013, upper: 0.084 },
    ],
    [
      { events: 27, total: 402, lower: 0.047, upper: 0.096 },
      { events: 9, total: 171, lower: 0.028, upper: 0.097 },
    ],
    [
      { events: 34, total: 163, lower: 0.153, upper: 0.277 },
      { events: 47, total: 219, lower: 0.165, upper: 0.274 },
    ],
  ],
);

const LIGHT = screenAppearance('light', 692);

beforeAll(() => {
  // A process-wide setting of Vega, as the application sets it on both sides.
  (vega as unknown as { textMetrics: { width: typeof vegaTextWidth } }).textMetrics.width =
    vegaTextWidth;
});

describe('groupedBarSpec', () => {
  it('draws without warnings, exactly as wide as asked', async () => {
    const { svg, warnings } = await draw(ECZEMA, LIGHT);
    expect(warnings).toEqual([]);
    expect(svg).toContain('width="692"');
  });

  it('draws every bar from zero, with its value, whisker and n', async () => {
    const { view } = await draw(ECZEMA, LIGHT);
    const bars = itemsOf(view, 'rect').filter((item) => item.datum.value !== undefined);
    const plotHeight = view.height();
    expect(bars).toHaveLength(6);
    for (const bar of bars) expect(bar.y + bar.height).toBeCloseTo(plotHeight, 6);
    const texts = textsOf(view);
    expect(texts).toEqual(
      expect.arrayContaining(['4.7', '3.4', '20.9', '21.5', '236', '118', 'None', 'Kitchen']),
    );
  });

  it('keeps whiskers asymmetric and unclipped', async () => {
    const { view } = await draw(ECZEMA, LIGHT);
    const stems = itemsOf(view, 'rule').filter((item) => item.datum.upper !== undefined);
    expect(stems).toHaveLength(12);
    const [first] = stems;
    expect(first?.datum.lower).toBeCloseTo(2.6, 10);
    expect(first?.datum.upper).toBeCloseTo(8.2, 10);
  });

  it('leaves the place of a missing bar empty and says so', async () => {
    const figure = sampleFigure(
      ['Letter', 'No letter'],
      ['All'],
      [
        [{ events: 62, total: 120, lower: 0.43, upper: 0.6 }],
        [{ events: 0, total: 0, lower: 0, upper: 0 }],
      ],
    );
    const { view } = await draw(figure, LIGHT);
    const bars = itemsOf(view, 'rect').filter((item) => item.datum.value !== undefined);
    expect(bars).toHaveLength(1);
    expect(textsOf(view)).toContain('…');
  });

  it('takes hostile labels as words only', async () => {
    const label = '\'];datum.value=0;//<script>\\[a.b"';
    const figure: GroupedBarFigure = {
      ...ECZEMA,
      valueLabel: label,
      categoriesLabel: label,
      groupsLabel: label,
      categories: ECZEMA.categories.map((category) => ({ ...category, label })),
      groups: ECZEMA.groups.map((group) => ({ ...group, label })),
    };
    const { view, compiled } = await draw(figure, { ...LIGHT, width: 1200 });
    expect(textsOf(view).filter((text) => text === label).length).toBeGreaterThan(4);
    expect(expressionsOf(compiled).some((text) => text.includes('script'))).toBe(false);
  });

  it('prints with a decimal comma', async () => {
    const figure: GroupedBarFigure = {
      ...ECZEMA,
      decimalMark: ',',
      bars: ECZEMA.bars.map((bar) => ({
        ...bar,
        value: (bar.value ?? 0) / 20,
        lower: (bar.lower ?? 0) / 20,
        upper: (bar.upper ?? 0) / 20,
        valueText: bar.valueText.replace('.', ','),
      })),
    };
    expect(textsOf((await draw(figure, LIGHT)).view)).toContain('0,5');
  });

  it('hatches from four groups on, and where a single ink is asked for', async () => {
    const row = [0, 1, 2, 3].map(() => ({ events: 40, total: 100, lower: 0.3, upper: 0.5 }));
    const four = sampleFigure(['Yes', 'No'], ['N', 'S', 'E', 'W'], [row, row]);
    const hatched = itemsOf((await draw(four, LIGHT)).view, 'rule');
    expect(hatched.some((item) => item.datum.fromY !== undefined)).toBe(true);
    const three = { ...four, groups: four.groups.slice(0, 3), bars: [] };
    const plain = itemsOf((await draw(three, LIGHT)).view, 'rule');
    expect(plain.some((item) => item.datum.fromY !== undefined)).toBe(false);
  });

  it('moves n into the labels and drops values where bars are narrow', async () => {
    const { view } = await draw(ECZEMA, { ...LIGHT, width: 180 });
    const texts = textsOf(view);
    expect(texts).not.toContain('4.7');
    expect(texts.join(' ')).toContain('n\u00a0=\u00a0236;');
  });
});

interface Item {
  readonly y: number;
  readonly height: number;
  readonly text?: string | readonly string[];
  readonly datum: Readonly<Record<string, unknown>>;
}

interface Drawn {
  readonly svg: string;
  readonly view: vega.View;
  readonly compiled: vega.Spec;
  readonly warnings: readonly string[];
}

async function draw(figure: GroupedBarFigure, appearance: FigureAppearance): Promise<Drawn> {
  const warnings: string[] = [];
  const logger = vega.logger(vega.Warn);
  logger.warn = (...messages: readonly unknown[]) => {
    warnings.push(messages.map(String).join(' '));
    return logger;
  };
  const spec: TopLevelSpec = groupedBarSpec(figure, appearance);
  const compiled = compile(spec, { logger }).spec;
  const view = new vega.View(vega.parse(compiled), { renderer: 'none', logger });
  return { svg: await view.toSVG(), view, compiled, warnings };
}

function itemsOf(view: vega.View, marktype: string): readonly Item[] {
  const found: Item[] = [];
  const visit = (mark: SceneMark): void => {
    for (const item of mark.items) {
      if (mark.marktype === marktype) found.push(item);
      for (const inner of item.items ?? []) visit(inner);
    }
  };
  visit((view.scenegraph() as unknown as { root: SceneMark }).root);
  return found;
}

interface SceneMark {
  readonly marktype: string;
  readonly items: readonly (Item & { readonly items?: readonly SceneMark[] })[];
}

function textsOf(view: vega.View): readonly string[] {
  return itemsOf(view, 'text').flatMap(({ text }) =>
    typeof text === 'string' ? [text] : (text ?? []),
  );
}

/** Every text in the compiled specification that Vega would run as an expression. */
function expressionsOf(value: unknown): readonly string[] {
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, part]) => {
    const isExpression = ['signal', 'expr', 'update', 'test', 'labelExpr'].includes(key);
    return isExpression && typeof part === 'string' ? [part] : expressionsOf(part);
  });
}
