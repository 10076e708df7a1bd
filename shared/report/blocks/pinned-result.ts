import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { LayoutElement } from '#shared/layout';
import type { PinnedAnalysis } from '../report';
import type { BlockContext } from './block-context';

/** The analysis that a block shows, or in words why it can't be shown. */
export function pinnedAnalysis(
  analysisId: string | null,
  { pins }: BlockContext,
): Result<PinnedAnalysis, string> {
  if (analysisId === null) return failure('No analysis is chosen yet. Choose one for this block.');
  const pinned = pins.get(analysisId);
  return pinned === undefined
    ? failure('The analysis that stood here is gone, or its result is not there yet.')
    : success(pinned);
}

/** Something that can't be printed, said in its place. */
export function problemElement(
  message: string,
  { blockId }: BlockContext,
): readonly LayoutElement[] {
  return [{ kind: 'problem', blockId, message }];
}
