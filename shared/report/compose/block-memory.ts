import type { LayoutElement } from '#shared/layout';
import type { PinnedAnalyses, PrintSetting } from '../blocks/block-context';
import { analysisIdsOf } from '../blocks/block-kinds';
import type { Block, PinnedAnalysis } from '../report';
import { composeBlock } from './compose-block';

/** Remembers what blocks were composed to. */
export interface BlockMemory {
  elementsOf(block: Block, setting: PrintSetting): readonly LayoutElement[];
}

/** How many settings are remembered for a block: the three framings, so that toggling is free. */
const REMEMBERED_SETTINGS = 3;

/** A memory that forgets a block with its object. */
export function createBlockMemory(): BlockMemory {
  const memories = new WeakMap<Block, RememberedBlock>();
  return {
    elementsOf: (block, setting) => {
      const remembered = memories.get(block) ?? { analysisIds: analysisIdsOf(block), made: [] };
      memories.set(block, remembered);
      return recall(remembered, block, setting);
    },
  };
}

interface RememberedBlock {
  readonly analysisIds: readonly string[];
  readonly made: MadeElements[];
}

interface MadeElements {
  readonly setting: PrintSetting;
  readonly pinned: readonly (PinnedAnalysis | undefined)[];
  readonly elements: readonly LayoutElement[];
}

function recall(
  { analysisIds, made }: RememberedBlock,
  block: Block,
  setting: PrintSetting,
): readonly LayoutElement[] {
  const pinned = pinnedOf(analysisIds, setting.pins);
  const known = made.find((one) => sameSetting(one, setting, pinned));
  if (known !== undefined) return known.elements;
  const elements = composeBlock(block, setting);
  made.unshift({ setting, pinned, elements });
  made.length = Math.min(made.length, REMEMBERED_SETTINGS);
  return elements;
}

function pinnedOf(
  analysisIds: readonly string[],
  pins: PinnedAnalyses,
): readonly (PinnedAnalysis | undefined)[] {
  return analysisIds.map((id) => pins.get(id));
}

function sameSetting(
  made: MadeElements,
  setting: PrintSetting,
  pinned: readonly (PinnedAnalysis | undefined)[],
): boolean {
  return (
    made.setting.framing === setting.framing &&
    made.setting.houseStyle === setting.houseStyle &&
    made.setting.phrasebook === setting.phrasebook &&
    made.pinned.every((pin, index) => samePin(pin, pinned[index]))
  );
}

/** A result never changes, so that a pin read again from the server is the same by its ids. */
function samePin(one: PinnedAnalysis | undefined, other: PinnedAnalysis | undefined): boolean {
  return (
    one?.resultId === other?.resultId &&
    one?.name === other?.name &&
    one?.number === other?.number &&
    outsideKey(one) === outsideKey(other)
  );
}

/** Estimates from elsewhere change beside a result; each change has a version. */
function outsideKey(pin: PinnedAnalysis | undefined): string {
  return (pin?.outside ?? []).map(({ id, version }) => `${id}@${String(version)}`).join();
}
