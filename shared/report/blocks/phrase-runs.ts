import type { Run } from '#shared/layout';
import { addressesOfPart } from '#shared/wording';
import type { Phrase, PhrasePart } from '#shared/wording';

/** The runs of generated words; each number is a run of its own, bound to its addresses. */
export function phraseRuns({ parts }: Phrase, blockId: string): readonly Run[] {
  return parts.map((part) => partRun(part, blockId));
}

function partRun(part: PhrasePart, blockId: string): Run {
  const addresses = addressesOfPart(part);
  const state = addresses.length === 0 ? 'text' : 'bound';
  const italic = part.kind === 'text' && part.italic === true;
  return {
    text: part.text,
    ...(italic ? { marks: ['italic'] } : {}),
    origin: { blockId, state, addresses },
  };
}
