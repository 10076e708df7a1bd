import { defaultSpecification, type ResultScope, type ValueAddress } from '#shared/analysis';
import { bound, effectSentence, groupedBarChart, heading, markdownProse, prose } from '../blocks';
import { reference, stratifiedTable } from '../blocks';
import type { BlockPlan, DemonstrationBlock, DemonstrationStudy } from '../demonstration-study';
import { alsoMissing, describeColumns } from '../describe-columns';
import { WET_WORK_ADJUSTED } from './wet-work-adjusted';

/** Wet work and hand eczema: a cohort with five ordered levels, two workplaces and two cuts. */
export const WET_WORK: DemonstrationStudy = {
  study: {
    title: 'Wet work and hand eczema in hospital and kitchen staff',
    design: 'cohort',
    population: 'staff of 6 hospitals and 11 canteen kitchens without hand eczema at the start',
    peopleNoun: 'workers',
  },
  outcome: {
    noun: 'new hand eczema',
    verbPhrase: 'developed new hand eczema',
    timeFrame: '12 months',
    desirability: 'harmful',
  },
  milestones: [
    { title: 'Draft of the results section', inDays: 4 },
    { title: 'Submission', inDays: 18 },
  ],
  dataSetName: 'Staff survey',
  cuts: [
    { file: 'wet-work-first-cut.csv', dataDate: '2026-03-14' },
    { file: 'wet-work-second-cut.csv', dataDate: '2026-09-14' },
  ],
  describe: (proposed) =>
    describeColumns(proposed, {
      'person-id': { label: 'Person' },
      workplace: {
        label: 'Workplace',
        sentenceLabel: 'workplace',
        withinPattern: '{level}',
        levels: [
          ['ward', 'Hospital ward', 'on hospital wards'],
          ['kitchen', 'Kitchen', 'in kitchens'],
        ],
      },
      'wet-work': {
        kind: 'orderedCategory',
        label: 'Wet work per shift',
        sentenceLabel: 'wet work per shift',
        groupPattern: '{people} with {level}',
        referenceLevelId: '0',
        levels: [
          ['0', 'None', 'no wet work'],
          ['1', 'Under 2 h', 'under 2 hours of wet work per shift'],
          ['2', '2 to <4 h', '2 to under 4 hours of wet work per shift'],
          ['3', '4 to <6 h', '4 to under 6 hours of wet work per shift'],
          ['4', '6 h or more', '6 hours or more of wet work per shift'],
        ],
        missingCodes: alsoMissing({ code: '9', reason: 'Not answered' }),
      },
      'eczema-12m': {
        label: 'New hand eczema',
        sentenceLabel: 'new hand eczema',
        levels: [
          ['0', 'No', 'no new hand eczema'],
          ['1', 'Yes', 'new hand eczema'],
        ],
        missingCodes: [{ code: '', reason: 'Lost before 12 months' }],
      },
      'age-years': { label: 'Age', sentenceLabel: 'age', unit: 'years' },
      'glove-hours': { label: 'Glove use per shift', sentenceLabel: 'glove use', unit: 'hours' },
    }),
  analyses: [
    {
      key: 'eczema',
      name: 'Hand eczema by wet work, within workplace',
      specification: (outcomeId) =>
        defaultSpecification({
          outcome: { outcomeId, columnId: 'eczema-12m', eventLevelIds: ['1'] },
          exposure: { columnId: 'wet-work', referenceLevelId: '0' },
          stratumColumnIds: ['workplace'],
          standing: {
            planned: 'prespecified',
            importance: 'primary',
            analysisSet: 'Staff seen at 12 months',
          },
        }),
      outside: WET_WORK_ADJUSTED,
    },
    {
      key: 'workplace',
      name: 'Hand eczema in kitchens against wards',
      specification: (outcomeId) =>
        defaultSpecification({
          outcome: { outcomeId, columnId: 'eczema-12m', eventLevelIds: ['1'] },
          exposure: { columnId: 'workplace', referenceLevelId: 'ward' },
        }),
    },
  ],
  reports: [
    { title: 'Twelve-month results', houseStyleId: 'open-clinical', framing: 'both', blocks },
  ],
};

const KITCHEN: ResultScope = { kind: 'stratum', stratumId: 'kitchen' };
const WARD: ResultScope = { kind: 'stratum', stratumId: 'ward' };

function blocks({ analysisIds, nextId }: BlockPlan): readonly DemonstrationBlock[] {
  const analysisId = analysisIds.eczema ?? '';
  const [table, figure] = [nextId(), nextId()];
  return [
    heading(nextId(), 1, 'Results'),
    heading(nextId(), 2, 'New hand eczema by wet work'),
    opening(nextId(), analysisId, table, figure),
    stratifiedTable(table, analysisId),
    effectSentence(nextId(), analysisId, '4', WARD),
    effectSentence(nextId(), analysisId, '4', KITCHEN),
    groupedBarChart(figure, analysisId),
    heading(nextId(), 2, 'Over both workplaces'),
    effectSentence(nextId(), analysisId, '4', { kind: 'pooled' }),
    effectSentence(nextId(), analysisId, '1', { kind: 'pooled' }),
    markdownProse(nextId(), NOTE),
  ];
}

const NOTE = `*Invented data, for demonstration.* Workers without hand eczema at the start were
asked about wet work and seen again after 12 months. An association is no proof of a cause; the
results need a statistician's and a clinician's reading.`;

function opening(
  id: string,
  analysisId: string,
  table: string,
  figure: string,
): DemonstrationBlock {
  const all: Omit<ValueAddress, 'quantity' | 'facet'> = {
    analysisId,
    levelId: null,
    scope: { kind: 'crude' },
  };
  const kitchen = (levelId: string): ValueAddress => ({
    ...{ analysisId, levelId, scope: KITCHEN, quantity: 'risk', facet: 'value' },
  });
  return prose(id, [
    'Over twelve months, ',
    bound({ ...all, quantity: 'events', facet: 'value' }),
    ' of ',
    bound({ ...all, quantity: 'total', facet: 'value' }),
    ' workers developed new hand eczema. The risk was higher at each level of wet work in both ' +
      'workplaces (',
    reference(table),
    ', ',
    reference(figure),
    '). In kitchens it was ',
    bound(kitchen('0')),
    ' among workers with no wet work and ',
    bound(kitchen('4')),
    ' among those with six hours or more per shift.',
  ]);
}
