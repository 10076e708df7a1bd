import { formatShare, levelPercent, withPercentSign } from '#shared/format';
import type { LayerResult } from '#shared/analysis';
import type { HouseStyle } from '#shared/house-style';
import type { GroupCount } from '#shared/stats';
import { fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import {
  figureStrataWords,
  occurrenceWords,
  printContext,
  type PrintContext,
  type PrintedAnalysis,
} from './print-context';

/**
 * What a bar chart of the analysis shows, for who cannot see it: what is compared, the lowest and
 * the highest bar, what the whiskers are. It tells no number that the chart does not print.
 */
export function altTextOf(analysis: PrintedAnalysis, style: HouseStyle, book: Phrasebook): string {
  const context = printContext(analysis, style, book);
  const { frame, specification } = analysis.result;
  const strata = figureStrataWords(context);
  const shared = {
    exposure: frame.exposure.sentenceLabel,
    strata: strata === null ? '' : fillWords(book, 'title.strata', { strata }),
    range: rangeWords(context),
    level: levelPercent(specification.level, style),
  };
  return frame.design === 'caseControl'
    ? fillWords(book, 'alt.exposed', { ...shared, outcome: frame.outcome.noun })
    : fillWords(book, 'alt.bars', { ...shared, outcome: occurrenceWords(context) });
}

interface Bar {
  readonly count: GroupCount;
  readonly place: string;
}

function rangeWords(context: PrintContext): string {
  const { result, style, book, decimals } = context;
  const layers = figureStrataWords(context) === null ? [result.crude] : result.strata;
  const shown = layers
    .flatMap((layer) => barsOf(context, layer))
    .flatMap((bar) => {
      const share = formatShare(bar.count, decimals.percent, style);
      return share ? [{ ...bar, share }] : [];
    })
    .toSorted((a, b) => a.share.value - b.share.value);
  const lowest = shown[0];
  const highest = shown.at(-1);
  return lowest && highest
    ? fillWords(book, 'alt.range', {
        lowest: withPercentSign(lowest.share.text, style),
        lowestPlace: lowest.place,
        highest: withPercentSign(highest.share.text, style),
        highestPlace: highest.place,
      })
    : fillWords(book, 'alt.noRange', {});
}

function barsOf({ result, book }: PrintContext, layer: LayerResult): readonly Bar[] {
  const { exposure, strata, design } = result.frame;
  const stratum = strata.find(({ id }) => id === layer.stratumId)?.label;
  const { events, total } = layer.total;
  return layer.levels.flatMap(({ levelId, count }) => {
    const level = exposure.levels.find(({ id }) => id === levelId)?.label ?? levelId;
    const place = [level, stratum].filter((label) => label !== undefined);
    const named = place.join(fillWords(book, 'list.comma', {}));
    return design === 'caseControl'
      ? [
          {
            count: { events: count.events, total: events },
            place: fillWords(book, 'alt.cases', { level: named }),
          },
          {
            count: { events: count.total - count.events, total: total - events },
            place: fillWords(book, 'alt.controls', { level: named }),
          },
        ]
      : [{ count, place: named }];
  });
}
