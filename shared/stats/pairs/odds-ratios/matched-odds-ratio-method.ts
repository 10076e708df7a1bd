import type { GroupCount } from '../../fourfold-table';
import type { IntervalMethod, Limits, MethodWords } from '../../intervals/interval-method';
import { intervalMethod } from '../../intervals/interval-method';
import type { PairedTable } from '../paired-table';
import { issueOfMatchedOddsRatio } from '../paired-table';

/** What a method's file states: limits of the share of first-only among the discordant pairs. */
export interface MatchedOddsRatioParts<Id extends string> extends MethodWords {
  readonly id: Id;
  readonly limitsOfShare: (discordant: GroupCount, z: number, level: number) => Limits;
}

/**
 * An interval for a matched odds ratio: limits of a binomial share, mapped to its odds.
 *
 * A ratio of 0 has the lower limit 0; an infinite one gives `zeroCell`, no discordant pair
 * `noDiscordantPairs`.
 */
export function matchedOddsRatioMethod<Id extends string>({
  limitsOfShare,
  ...words
}: MatchedOddsRatioParts<Id>): IntervalMethod<PairedTable> & { readonly id: Id } {
  return intervalMethod<PairedTable, Id>(issueOfMatchedOddsRatio, {
    ...words,
    limits({ onlyFirst, onlySecond }, z, level) {
      const discordant = { events: onlyFirst, total: onlyFirst + onlySecond };
      const [lower, upper] = limitsOfShare(discordant, z, level);
      return [lower / (1 - lower), upper / (1 - upper)];
    },
  });
}
