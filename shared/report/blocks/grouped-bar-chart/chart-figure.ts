import type { AnalysisResult } from '#shared/analysis';
import { designGivesRisk } from '#shared/effects';
import { decimalsOf } from '#shared/format';
import type { GroupedBarFigure } from '#shared/layout';
import { fillWords, valueAxisTitle } from '#shared/wording';
import type { Phrasebook } from '#shared/wording';
import type { PinnedAnalysis } from '../../report';
import type { BlockContext } from '../block-context';
import { chartBar } from './chart-bar';
import type { BarPlace, ChartSetting } from './chart-bar';

/** What the chart of an analysis shows, as data. */
export function figureOf(
  { analysisId, result }: PinnedAnalysis,
  showValues: boolean,
  { houseStyle, phrasebook }: BlockContext,
): GroupedBarFigure {
  const decimals = decimalsOf(result, houseStyle).percent;
  const setting: ChartSetting = { analysisId, result, houseStyle, decimals };
  const { exposure } = result.frame;
  const groups = groupsOf(result, phrasebook);
  const categories = exposure.levels.map(({ id, label }) => {
    const bars = groups.map(({ place }) => chartBar({ ...place, levelId: id }, setting));
    const totals = bars.map(({ totalText }) => totalText).join('; ');
    return { id, label, note: `n\u00a0=\u00a0${totals}`, bars };
  });
  return {
    kind: 'groupedBars',
    categories: categories.map(({ id, label, note }) => ({ id, label, note })),
    groups: groups.map(({ place, label }) => ({ id: place.groupId, label })),
    groupsLabel: designGivesRisk(result.frame.design) ? result.frame.strataLabel : null,
    categoriesLabel: exposure.label,
    valueLabel: valueAxisTitle({ analysisId, result }, houseStyle, phrasebook),
    valueScale: 100,
    decimalMark: houseStyle.numbers.decimalMark,
    bars: categories.flatMap(({ bars }) => bars),
    showValues,
    ordered: false,
  };
}

interface ChartGroup {
  readonly label: string;
  readonly place: Omit<BarPlace, 'levelId'>;
}

function groupsOf(result: AnalysisResult, book: Phrasebook): readonly ChartGroup[] {
  const crude = { kind: 'crude' } as const;
  const { design, strata, exposure } = result.frame;
  if (!designGivesRisk(design)) {
    return [
      {
        label: fillWords(book, 'bars.cases', {}),
        place: { groupId: 'cases', scope: crude, quantity: 'shareOfCases' },
      },
      {
        label: fillWords(book, 'bars.controls', {}),
        place: { groupId: 'controls', scope: crude, quantity: 'shareOfControls' },
      },
    ];
  }
  if (strata.length === 0) {
    return [{ label: exposure.label, place: { groupId: 'all', scope: crude, quantity: 'risk' } }];
  }
  return strata.map(({ id, label }) => ({
    label,
    place: { groupId: id, scope: { kind: 'stratum', stratumId: id }, quantity: 'risk' },
  }));
}
