import type { FigureModel } from '#shared/layout';
import { printableLine } from '../printable-text';

/** A figure whose every label can stand in an XML file. */
export function printableFigure(figure: FigureModel): FigureModel {
  return printable(figure) as FigureModel;
}

/** Plain data with every text in it made printable; labels may be added anywhere in a figure. */
function printable(value: unknown): unknown {
  if (typeof value === 'string') return printableLine(value);
  if (Array.isArray(value)) return value.map(printable);
  if (typeof value !== 'object' || value === null) return value;
  const entries = Object.entries(value).map(([key, field]) => [key, printable(field)]);
  return Object.fromEntries(entries) as unknown;
}
