import { defaultSpecification } from '#shared/analysis';
import {
  effectSentence,
  groupedBarChart,
  heading,
  markdownProse,
  stratifiedTable,
} from '../blocks';
import type { BlockPlan, DemonstrationBlock, DemonstrationStudy } from '../demonstration-study';
import { type ColumnDescription, describeColumns } from '../describe-columns';

/** Harbour supper: a retrospective cohort of guests with small counts. */
export const HARBOUR_SUPPER: DemonstrationStudy = {
  study: {
    title: 'Harbour supper outbreak',
    design: 'cohort',
    population: 'guests of one harbour supper who answered the questionnaire',
    peopleNoun: 'guests',
  },
  outcome: {
    noun: 'vomiting or diarrhoea',
    verbPhrase: 'fell ill with vomiting or diarrhoea',
    timeFrame: '72 hours',
    desirability: 'harmful',
  },
  milestones: [{ title: 'Report to the harbour authority', inDays: 2 }],
  dataSetName: 'Guest questionnaire',
  cuts: [{ file: 'harbour-supper-guests.csv', dataDate: '2026-06-20' }],
  describe: (proposed) =>
    describeColumns(proposed, {
      sitting: {
        label: 'Sitting',
        sentenceLabel: 'sitting',
        withinPattern: 'at the {level}',
        levels: [
          ['early', 'Early sitting', 'early sitting'],
          ['late', 'Late sitting', 'late sitting'],
        ],
      },
      'fish-pie': dish('Fish pie', 'the fish pie'),
      mussels: dish('Mussels', 'the mussels'),
      'potato-salad': dish('Potato salad', 'the potato salad'),
      'berry-trifle': dish('Berry trifle', 'the berry trifle'),
      'ill-72h': {
        label: 'Fell ill',
        sentenceLabel: 'illness',
        levels: [
          ['well', 'Well', 'no illness'],
          ['ill', 'Ill', 'illness'],
        ],
      },
    }),
  analyses: [
    dishAnalysis('fishPie', 'Illness by fish pie, within sitting', 'fish-pie', ['sitting']),
    dishAnalysis('mussels', 'Illness by mussels', 'mussels', []),
    dishAnalysis('salad', 'Illness by potato salad', 'potato-salad', []),
  ],
  reports: [
    {
      title: 'Attack rates by dish',
      houseStyleId: 'public-bulletin',
      framing: 'absolute',
      blocks,
    },
  ],
};

function dish(label: string, words: string): ColumnDescription {
  return {
    label,
    sentenceLabel: label.toLowerCase(),
    groupPattern: '{people} who {level}',
    referenceLevelId: 'no',
    levels: [
      ['no', 'Did not eat', `did not eat ${words}`],
      ['yes', 'Ate', `ate ${words}`],
    ],
  };
}

function dishAnalysis(
  key: string,
  name: string,
  columnId: string,
  stratumColumnIds: readonly string[],
): DemonstrationStudy['analyses'][number] {
  return {
    key,
    name,
    specification: (outcomeId) =>
      defaultSpecification({
        outcome: { outcomeId, columnId: 'ill-72h', eventLevelIds: ['ill'] },
        exposure: { columnId, referenceLevelId: 'no' },
        stratumColumnIds,
      }),
  };
}

function blocks({ analysisIds, nextId }: BlockPlan): readonly DemonstrationBlock[] {
  const { fishPie = '', mussels = '', salad = '' } = analysisIds;
  return [
    heading(nextId(), 1, 'Who fell ill'),
    markdownProse(nextId(), NOTE),
    stratifiedTable(nextId(), fishPie),
    effectSentence(nextId(), fishPie, 'yes', { kind: 'pooled' }),
    groupedBarChart(nextId(), fishPie),
    heading(nextId(), 2, 'Other dishes'),
    effectSentence(nextId(), mussels, 'yes', { kind: 'crude' }),
    effectSentence(nextId(), salad, 'yes', { kind: 'crude' }),
  ];
}

const NOTE = `*Invented data, for demonstration.* Small counts can identify people: follow the data
agreement and the local disclosure rules before anything of this kind leaves the team.`;
