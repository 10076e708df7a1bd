import type { Type } from '@angular/core';
import type { BlockKindId } from '#shared/report';
import { EffectBalance } from './effect-sentence/effect-balance';

/** What stands under a block while it is in hand; the component gets the block as `block`. */
const COMPANIONS: Readonly<Partial<Record<BlockKindId, Companion>>> = {
  effectSentence: { component: EffectBalance, handles: ['framing'] },
};

/** A component, and the paths of fields that it edits in the form's stead. */
export interface Companion {
  readonly component: Type<unknown>;
  readonly handles: readonly string[];
}

/** What stands under blocks of a kind; null where nothing does. */
export function companionOf(kindId: string): Companion | null {
  return (COMPANIONS as Readonly<Record<string, Companion | undefined>>)[kindId] ?? null;
}
