import type { LayoutElement } from '#shared/layout';
import { runsOf } from '#shared/report';

/** Whether a block prints no sign at all, so that a hint has to stand in its place. */
export function printsNothing(elements: readonly LayoutElement[]): boolean {
  return elements.every((element) => {
    const hasOwnPlace =
      element.kind === 'problem' || element.kind === 'table' || element.kind === 'figure';
    return !hasOwnPlace && runsOf(element).every((run) => run.text.trim() === '');
  });
}
