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
import { withEventsAndTotal } from '../two-counts';

/** Reminder letters: a trial with a beneficial outcome, aggregated by clinic. */
export const REMINDER_LETTERS: DemonstrationStudy = {
  study: {
    title: 'Reminder letters and screening uptake',
    design: 'trial',
    population: 'people due for bowel screening at four clinics, assigned by random numbers',
    peopleNoun: 'people',
  },
  outcome: {
    noun: 'screening uptake',
    verbPhrase: 'attended screening',
    timeFrame: '12 weeks',
    desirability: 'beneficial',
  },
  milestones: [{ title: 'Steering group', inDays: 9 }],
  dataSetName: 'Attendance by clinic',
  cuts: [{ file: 'reminder-letters-by-clinic.csv', dataDate: '2026-05-30' }],
  describe: (proposed) =>
    describeColumns(withEventsAndTotal(proposed, 'attended', 'invited'), {
      clinic: {
        label: 'Clinic',
        sentenceLabel: 'clinic',
        withinPattern: 'at {level}',
        kind: 'category',
      },
      letter: {
        label: 'Letter',
        sentenceLabel: 'letter',
        groupPattern: '{people} sent {level}',
        referenceLevelId: 'usual-invitation',
        levels: [
          ['usual invitation', 'Usual invitation', 'the usual invitation'],
          ['reminder letter', 'Reminder letter', 'a reminder letter'],
        ],
      },
      [COUNTED_OUTCOME_COLUMN_ID]: {
        label: 'Screening uptake',
        sentenceLabel: 'screening uptake',
        levels: [
          ['event', 'Attended', 'attendance'],
          ['non-event', 'Did not attend', 'no attendance'],
        ],
      },
    }),
  analyses: [
    {
      key: 'uptake',
      name: 'Uptake by letter, within clinic',
      specification: (outcomeId) =>
        defaultSpecification({
          outcome: {
            outcomeId,
            columnId: COUNTED_OUTCOME_COLUMN_ID,
            eventLevelIds: ['event'],
          },
          exposure: { columnId: 'letter', referenceLevelId: 'usual-invitation' },
          stratumColumnIds: ['clinic'],
          standing: {
            planned: 'prespecified',
            importance: 'primary',
            analysisSet: 'Everybody as assigned',
          },
        }),
    },
  ],
  reports: [{ title: 'Main outcome', houseStyleId: 'compact-clinical', framing: 'both', blocks }],
};

function blocks({ analysisIds, nextId }: BlockPlan): readonly DemonstrationBlock[] {
  const uptake = analysisIds.uptake ?? '';
  return [
    heading(nextId(), 1, 'Screening uptake'),
    effectSentence(nextId(), uptake, 'reminder-letter', { kind: 'pooled' }),
    stratifiedTable(nextId(), uptake),
    groupedBarChart(nextId(), uptake),
    markdownProse(nextId(), '*Invented data, for demonstration.*'),
  ];
}
