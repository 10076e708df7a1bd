import type { Caption, LayoutElement } from '#shared/layout';

/** The label and the number of each block's table or figure, by block id. */
export type CaptionNumbers = ReadonlyMap<string, Pick<Caption, 'label' | 'number'>>;

/** Counts tables and figures, each from 1, in the order of print. */
export function numberCaptions(elements: readonly LayoutElement[]): CaptionNumbers {
  const counts = { Table: 0, Figure: 0 };
  const numbers = new Map<string, Pick<Caption, 'label' | 'number'>>();
  for (const element of elements) {
    const caption = captionOf(element);
    if (caption === null || numbers.has(element.blockId)) continue;
    counts[caption.label] += 1;
    numbers.set(element.blockId, { label: caption.label, number: counts[caption.label] });
  }
  return numbers;
}

/** The caption of an element; null for those that have none. */
export function captionOf(element: LayoutElement): Caption | null {
  switch (element.kind) {
    case 'table':
    case 'figure':
      return element.caption;
    case 'heading':
    case 'paragraph':
    case 'list':
    case 'problem':
      return null;
  }
}
