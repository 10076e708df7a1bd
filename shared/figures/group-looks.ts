import type { GroupedBarFigure } from '#shared/layout';
import type { FigureAppearance } from './appearance';
import { FIGURE_COLOURS } from './figure-colours';
import { HATCHINGS } from './hatching';
import type { Hatching } from './hatching';

/** How the bars of a group and its key look. */
export interface GroupLook {
  readonly groupId: string;
  readonly label: string;
  readonly fill: string;
  readonly hatching: Hatching;
  /** Ink that is seen on `fill`. */
  readonly hatchInk: string;
}

/** From this many groups on, colours alone lie too close together in grey. */
const HATCHED_FROM = 4;

/** The looks of the groups of a figure, in print order; the caption line's key uses them too. */
export function groupLooks(
  figure: GroupedBarFigure,
  { theme, hatching }: Pick<FigureAppearance, 'theme' | 'hatching'>,
): readonly GroupLook[] {
  const colours = FIGURE_COLOURS[theme];
  const ramp = figure.ordered && figure.groups.length > 1 ? colours.levels : colours.categories;
  const several = figure.groups.length > 1;
  const hatched = several && (hatching === 'always' || figure.groups.length >= HATCHED_FROM);
  return figure.groups.map(({ id, label }, index) => {
    const look = hatched ? hatchingAt(index) : 'solid';
    const fill = look === 'open' ? colours.page : (ramp[index % ramp.length] ?? colours.page);
    const hatchInk = contrastingInk(fill, [colours.ink, colours.page]);
    return { groupId: id, label, fill, hatching: look, hatchInk };
  });
}

function hatchingAt(index: number): Hatching {
  return HATCHINGS[index % HATCHINGS.length] ?? 'solid';
}

function contrastingInk(fill: string, inks: readonly [string, string]): string {
  const distance = (ink: string): number => Math.abs(luminance(ink) - luminance(fill));
  return distance(inks[0]) >= distance(inks[1]) ? inks[0] : inks[1];
}

/** Relative luminance of an sRGB colour such as #1B6E5F, as WCAG 2.2 defines it. */
function luminance(colour: string): number {
  const channel = (start: number): number => {
    const share = Number.parseInt(colour.slice(start, start + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}
