import type { HouseStyle } from '#shared/house-style';
import type { Claim } from './claim';
import type { Framing, Phrase } from './phrase';
import { startSentence } from './phrasebook/fill-pattern';
import type { Phrasebook } from './phrasebook/phrasebook';
import { oddsSentence } from './sentence/odds-sentence';
import { riskSentence } from './sentence/risk-sentences';
import { wordingContext } from './sentence/wording-context';

/**
 * The sentence of a claim under a framing and a house style.
 *
 * The framing chooses what leads; both groups' counts stay in every framing. A framing that the
 * design does not give (see `availableFramings`) reads as the one that it gives. Every number is a
 * bound part; the sentence ends with a full stop.
 */
export function phraseOfClaim(
  claim: Claim,
  framing: Framing,
  style: HouseStyle,
  book: Phrasebook,
): Phrase {
  const context = wordingContext(claim, style, book);
  const parts =
    claim.design === 'caseControl' ? oddsSentence(context) : riskSentence(context, framing);
  return { parts: startSentence(parts) };
}

/** The framings in which a claim can be said; a case–control study gives odds only. */
export function availableFramings({ design }: Claim): readonly Framing[] {
  return design === 'caseControl' ? ['relative'] : ['absolute', 'both', 'relative'];
}
