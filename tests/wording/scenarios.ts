import type { AnalysisResult, ResultScope } from '#shared/analysis';
import { admissions, ageByClass, spectacles, wetWork } from './stratified-scenarios';
import {
  BALANCE_TRAINING,
  LIFTING,
  NIGHT_WORK,
  NOTIFIED,
  REMINDERS,
  SCREENS,
  SUPPER,
  twoGroups,
  UPTAKE,
  type TwoGroups,
} from './two-group-scenarios';

/** A result and the effects of it that the phrase table says. */
export interface Scenario {
  readonly name: string;
  readonly result: AnalysisResult;
  readonly targets: readonly { readonly indexLevelId: string; readonly scope: ResultScope }[];
}

const CRUDE: ResultScope = { kind: 'crude' };
const POOLED: ResultScope = { kind: 'pooled' };

function within(stratumId: string): ResultScope {
  return { kind: 'stratum', stratumId };
}

function simple(name: string, groups: TwoGroups): Scenario {
  return { name, result: twoGroups(groups), targets: [{ indexLevelId: 'index', scope: CRUDE }] };
}

const POST_HOC = {
  standing: { planned: 'postHoc', importance: 'secondary', analysisSet: 'all records' },
} as const;

/** Every situation that a sentence has to cope with. */
export const SCENARIOS: readonly Scenario[] = [
  simple('Cohort, higher, below twofold', NIGHT_WORK),
  simple('Trial, lower', BALANCE_TRAINING),
  simple('Trial, unclear', REMINDERS),
  simple('Trial, beneficial outcome', UPTAKE),
  simple('Case–control, two levels', LIFTING),
  simple('Cross-sectional', SCREENS),
  simple('Surveillance, fourfold', NOTIFIED),
  simple('Cohort, no events in the reference group', SUPPER),
  simple('Cohort, no events in the index group', {
    ...SUPPER,
    index: ['ate the bread', 0, 45],
    reference: ['did not', 5, 31],
  }),
  simple('Cohort, no events at all', {
    ...SUPPER,
    index: ['ate the salad', 0, 31],
    reference: ['did not', 0, 30],
  }),
  simple('Cohort, everybody in both groups', {
    ...SUPPER,
    index: ['ate the soup', 31, 31],
    reference: ['did not', 30, 30],
  }),
  simple('Cohort, empty index group', { ...SUPPER, index: ['ate the cake', 0, 0] }),
  simple('Cohort, very small groups', {
    ...SUPPER,
    index: ['ate the crab', 7, 9],
    reference: ['did not', 2, 12],
  }),
  simple('Cohort, the same risk in both groups', {
    ...NIGHT_WORK,
    index: ['night shifts', 50, 500],
    reference: ['day shifts only', 60, 600],
  }),
  simple('Case–control, unclear', {
    ...LIFTING,
    index: ['lifted heavy loads', 60, 175],
    reference: ['did not lift heavy loads', 150, 455],
  }),
  simple('Case–control, lower odds', {
    ...LIFTING,
    index: ['used a hoist', 40, 200],
    reference: ['used no hoist', 170, 430],
  }),
  simple('Case–control, no exposed controls', {
    ...LIFTING,
    index: ['lifted heavy loads', 12, 12],
    reference: ['did not lift heavy loads', 88, 188],
  }),
  simple('Cohort, post hoc', { ...NIGHT_WORK, specification: POST_HOC }),
  {
    name: 'Cohort, several levels in strata',
    result: wetWork(),
    targets: [
      { indexLevelId: 'over6', scope: CRUDE },
      { indexLevelId: 'over6', scope: within('ward') },
      { indexLevelId: 'under2', scope: within('kitchen') },
      { indexLevelId: 'over6', scope: POOLED },
      { indexLevelId: 'under2', scope: POOLED },
    ],
  },
  {
    name: 'The same, seen from the highest level',
    result: wetWork('over6'),
    targets: [
      { indexLevelId: 'none', scope: within('kitchen') },
      { indexLevelId: 'none', scope: POOLED },
    ],
  },
  {
    name: 'Post hoc, within a stratum and pooled',
    result: wetWork('none', POST_HOC),
    targets: [
      { indexLevelId: 'over6', scope: within('kitchen') },
      { indexLevelId: 'over6', scope: POOLED },
    ],
  },
  {
    name: 'Open admissions data as they come, turned round by pooling',
    result: admissions(),
    targets: [
      { indexLevelId: 'male', scope: CRUDE },
      { indexLevelId: 'male', scope: within('A') },
      { indexLevelId: 'male', scope: POOLED },
    ],
  },
  {
    name: 'Open survival data, age by class',
    result: ageByClass(),
    targets: [
      { indexLevelId: 'child', scope: within('second') },
      { indexLevelId: 'child', scope: within('crew') },
      { indexLevelId: 'child', scope: POOLED },
    ],
  },
  {
    name: 'Case–control, several levels',
    result: spectacles(),
    targets: [
      { indexLevelId: 'one', scope: CRUDE },
      { indexLevelId: 'over3', scope: CRUDE },
    ],
  },
  {
    name: 'Case–control, several levels in strata',
    result: spectacles('two'),
    targets: [
      { indexLevelId: 'over3', scope: within('hill') },
      { indexLevelId: 'one', scope: within('hill') },
      { indexLevelId: 'over3', scope: POOLED },
      { indexLevelId: 'one', scope: POOLED },
    ],
  },
];
