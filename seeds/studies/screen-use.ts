import { defaultSpecification } from '#shared/analysis';
import { COUNTED_OUTCOME_COLUMN_ID } from '#shared/code-book';
import {
  effectSentence,
  groupedBarChart,
  heading,
  markdownProse,
  stratifiedTable,
} from '../blocks';
import type { BlockPlan, DemonstrationBlock, DemonstrationStudy } from '../demonstration-study';
import { describeColumns } from '../describe-columns';

/** Evening screen use: a case-control study, so odds ratios only. */
export const SCREEN_USE: DemonstrationStudy = {
  study: {
    title: 'Evening screen use and needing new spectacles',
    design: 'caseControl',
    population: 'customers of nine opticians who needed stronger lenses, and customers who did not',
    peopleNoun: 'people',
  },
  outcome: {
    noun: 'needing new spectacles',
    verbPhrase: 'needed new spectacles',
    timeFrame: null,
    desirability: 'harmful',
  },
  milestones: [{ title: 'First full draft', inDays: 25 }],
  dataSetName: 'Opticians',
  cuts: [{ file: 'evening-screen-use.csv', dataDate: '2026-02-11' }],
  describe: (proposed) =>
    describeColumns(proposed, {
      'age-band': {
        label: 'Age',
        sentenceLabel: 'age',
        unit: 'years',
        withinPattern: 'among people aged {level} years',
        levels: [
          ['18-29', '18–29', '18 to 29'],
          ['30-44', '30–44', '30 to 44'],
          ['45-59', '45–59', '45 to 59'],
        ],
      },
      'evening-screen-hours': {
        label: 'Evening screen use',
        sentenceLabel: 'evening screen use',
        groupPattern: '{people} with {level}',
        levels: [
          ['under 1 h', 'Under 1 h', 'under 1 hour of evening screen use'],
          ['1 to <2 h', '1 to <2 h', '1 to under 2 hours of evening screen use'],
          ['2 to <4 h', '2 to <4 h', '2 to under 4 hours of evening screen use'],
          ['4 h or more', '4 h or more', '4 hours or more of evening screen use'],
        ],
      },
      [COUNTED_OUTCOME_COLUMN_ID]: { label: 'New spectacles', sentenceLabel: 'new spectacles' },
    }),
  analyses: [
    {
      key: 'spectacles',
      name: 'New spectacles by evening screen use, within age',
      specification: (outcomeId) =>
        defaultSpecification({
          outcome: { outcomeId, columnId: COUNTED_OUTCOME_COLUMN_ID, eventLevelIds: ['event'] },
          exposure: { columnId: 'evening-screen-hours', referenceLevelId: 'under-1-h' },
          stratumColumnIds: ['age-band'],
        }),
    },
  ],
  reports: [
    {
      title: 'Case–control results',
      houseStyleId: 'bracketed-social-health',
      framing: 'relative',
      blocks,
    },
  ],
};

function blocks({ analysisIds, nextId }: BlockPlan): readonly DemonstrationBlock[] {
  const spectacles = analysisIds.spectacles ?? '';
  return [
    heading(nextId(), 1, 'Evening screen use'),
    effectSentence(nextId(), spectacles, '4-h-or-more', { kind: 'pooled' }),
    stratifiedTable(nextId(), spectacles),
    groupedBarChart(nextId(), spectacles),
    markdownProse(nextId(), '*Invented data, for demonstration.*'),
  ];
}
