import * as z from 'zod/mini';
import type { ResultScope } from '#shared/analysis';
import { FRAMINGS } from '#shared/wording/phrase';
import type { PinnedAnalysis } from '../../report';
import type { BlockField } from '../block-field';
import type { BlockKind, EmptyContentContext } from '../block-kind';
import { contentParser, idSchema, lineSchema, scopeSchema } from '../content-schema';
import { analysisIdsIn } from '../inline-context';
import { composeEffectSentence } from './compose-sentence';
import type { EffectSentenceContent } from './content';

/** An effect sentence. */
export const EFFECT_SENTENCE: BlockKind<EffectSentenceContent> = {
  id: 'effectSentence',
  label: 'Effect sentence',
  description: 'One level against the reference, said in words that follow the numbers.',
  rights: 'words',
  needsAnalysis: true,
  fields: fields(),
  editableText: null,
  parseContent: contentParser<EffectSentenceContent>(
    z.object({
      schemaVersion: z.literal(1),
      analysisId: z.nullable(idSchema),
      indexLevelId: z.nullable(idSchema),
      scope: scopeSchema,
      framing: z.nullable(z.enum(FRAMINGS)),
      lead: z.nullable(lineSchema),
      tail: z.nullable(lineSchema),
      outside: z.optional(z.boolean()),
    }),
  ),
  emptyContent,
  analysisIdsOf: (content) => [
    ...new Set([
      ...analysisIdsIn(content.lead, content.analysisId),
      ...analysisIdsIn(content.tail),
    ]),
  ],
  compose: composeEffectSentence,
};

function emptyContent({ analysis }: EmptyContentContext): EffectSentenceContent {
  return {
    schemaVersion: 1,
    analysisId: analysis?.analysisId ?? null,
    indexLevelId: analysis === null ? null : lastContrastLevel(analysis),
    scope: analysis === null ? { kind: 'crude' } : firstScope(analysis),
    framing: null,
    lead: null,
    tail: null,
    outside: false,
  };
}

/** The last level other than the reference: on an ordered exposure, the far end. */
function lastContrastLevel({ result }: PinnedAnalysis): string | null {
  return result.crude.contrasts.at(-1)?.indexLevelId ?? null;
}

function firstScope({ result }: PinnedAnalysis): ResultScope {
  const pooled = result.specification.adjustment === 'mantelHaenszel' && result.pooled.length > 0;
  return pooled ? { kind: 'pooled' } : { kind: 'crude' };
}

function fields(): readonly BlockField[] {
  return [
    { kind: 'analysis', path: 'analysisId', label: 'Analysis' },
    { kind: 'indexLevel', path: 'indexLevelId', label: 'Level', analysisPath: 'analysisId' },
    { kind: 'scope', path: 'scope', label: 'In whom', analysisPath: 'analysisId' },
    {
      kind: 'choice',
      path: 'framing',
      label: 'This sentence says',
      options: [
        { value: null, label: 'As the report' },
        { value: 'absolute', label: 'Absolute' },
        { value: 'both', label: 'Both' },
        { value: 'relative', label: 'Relative' },
      ],
    },
    { kind: 'toggle', path: 'outside', label: 'Adjusted estimate, computed elsewhere' },
    ownWords('lead', 'Words before', 'Nothing before the sentence'),
    ownWords('tail', 'Words after', 'Nothing after the sentence'),
  ];
}

function ownWords(path: string, label: string, hint: string): BlockField {
  return { kind: 'text', path, label, paragraphs: 'one', optional: true, hint };
}
