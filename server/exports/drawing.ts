import type { LayoutElement } from '#shared/layout';

/** The layout element of a kind. */
export type ElementOf<Kind extends LayoutElement['kind']> = Extract<
  LayoutElement,
  { readonly kind: Kind }
>;

/** What a format makes of each kind of element; a new kind asks every format for its answer. */
export type Drawing<Drawn> = {
  readonly [Kind in LayoutElement['kind']]: (element: ElementOf<Kind>) => Drawn;
};

/** Draws one element. */
export function drawElement<Drawn>(element: LayoutElement, drawing: Drawing<Drawn>): Drawn {
  const draw = drawing[element.kind] as (element: LayoutElement) => Drawn;
  return draw(element);
}
