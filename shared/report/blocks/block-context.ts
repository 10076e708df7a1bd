import type { HouseStyle } from '#shared/house-style';
import type { Framing, Phrasebook } from '#shared/wording';
import type { PinnedAnalysis } from '../report';

/** The analyses that a report shows, by analysis id, each with its pinned result. */
export type PinnedAnalyses = ReadonlyMap<string, PinnedAnalysis>;

/** What the blocks of a report are printed under. */
export interface PrintSetting {
  readonly framing: Framing;
  readonly houseStyle: HouseStyle;
  readonly phrasebook: Phrasebook;
  readonly pins: PinnedAnalyses;
}

/** What one block is printed under. */
export interface BlockContext extends PrintSetting {
  readonly blockId: string;
}
