import type { ResultScope } from '#shared/analysis';
import type { Framing } from '#shared/wording';
import type { TextDocument } from '../../text/text-document';

/**
 * Content of an effect sentence: one level against the reference within one scope. A null
 * `framing` follows the report. `lead` and `tail` are the writer's own words before and after the
 * bound sentence.
 */
export interface EffectSentenceContent {
  readonly schemaVersion: 1;
  readonly analysisId: string | null;
  readonly indexLevelId: string | null;
  readonly scope: ResultScope;
  readonly framing: Framing | null;
  readonly lead: TextDocument | null;
  readonly tail: TextDocument | null;
  /** Whether the adjusted estimates of the level, computed elsewhere, follow the sentence. */
  readonly outside?: boolean;
}
