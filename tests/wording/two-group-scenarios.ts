import type { AnalysisResult, OutcomeWords } from '#shared/analysis';
import type { StudyDesign } from '#shared/effects';
import {
  analysisOfCounts,
  level,
  type Counted,
  type CountedScenario,
} from '../builders/analysis-of-counts';

/** A comparison of two groups, each with its words and its events and total. */
export interface TwoGroups {
  readonly design: StudyDesign;
  readonly people: string;
  readonly outcome: Omit<OutcomeWords, 'id'>;
  readonly exposure: string;
  readonly pattern?: string;
  readonly index: readonly [words: string, ...counted: Counted];
  readonly reference: readonly [words: string, ...counted: Counted];
  readonly specification?: CountedScenario['specification'];
}

/** The result of a comparison of two groups, index "index" against reference "reference". */
export function twoGroups(groups: TwoGroups): AnalysisResult {
  const [indexWords, ...index] = groups.index;
  const [referenceWords, ...reference] = groups.reference;
  return analysisOfCounts({
    frame: {
      design: groups.design,
      peopleNoun: groups.people,
      population: '',
      outcome: { id: 'outcome', ...groups.outcome },
      exposure: {
        columnId: 'exposure',
        label: groups.exposure,
        sentenceLabel: groups.exposure,
        unit: null,
        ordered: false,
        groupPattern: groups.pattern ?? null,
        levels: [level('reference', referenceWords), level('index', indexWords)],
        referenceLevelId: 'reference',
      },
    },
    counts: { '': { index, reference } },
    ...(groups.specification ? { specification: groups.specification } : {}),
  });
}

/** The commonest way to name a group. */
export const WITH = '{people} with {level}';

/** Invented: night work and blood pressure. */
export const NIGHT_WORK: TwoGroups = {
  design: 'cohort',
  people: 'workers',
  outcome: {
    noun: 'new hypertension',
    verbPhrase: 'developed hypertension',
    timeFrame: '5 years',
    desirability: 'harmful',
  },
  exposure: 'shift',
  pattern: WITH,
  index: ['night shifts', 84, 620],
  reference: ['day shifts only', 58, 640],
};

/** Invented: balance training and falls. */
export const BALANCE_TRAINING: TwoGroups = {
  design: 'trial',
  people: 'participants',
  outcome: {
    noun: 'any fall',
    verbPhrase: 'fell',
    timeFrame: '12 months',
    desirability: 'harmful',
  },
  exposure: 'arm',
  pattern: '{people} assigned to {level}',
  index: ['balance training', 96, 512],
  reference: ['usual advice', 126, 508],
};

/** Invented: lifting and back injury. */
export const LIFTING: TwoGroups = {
  design: 'caseControl',
  people: 'workers',
  outcome: {
    noun: 'back injury',
    verbPhrase: 'injured their back',
    timeFrame: null,
    desirability: 'harmful',
  },
  exposure: 'heavy lifting',
  pattern: '{people} who {level}',
  index: ['lifted heavy loads', 142, 322],
  reference: ['did not lift heavy loads', 68, 308],
};

/** Invented: screens and dry eyes. */
export const SCREENS: TwoGroups = {
  design: 'crossSectional',
  people: 'employees',
  outcome: {
    noun: 'dry-eye symptoms',
    verbPhrase: 'had dry-eye symptoms',
    timeFrame: null,
    desirability: 'harmful',
  },
  exposure: 'screen use',
  pattern: WITH,
  index: ['over 8 hours of screen use', 312, 780],
  reference: ['up to 8 hours of screen use', 208, 840],
};

/** Invented: reminder texts and missed visits; too small to tell. */
export const REMINDERS: TwoGroups = {
  design: 'trial',
  people: 'patients',
  outcome: {
    noun: 'a missed visit',
    verbPhrase: 'missed a visit',
    timeFrame: '6 months',
    desirability: 'harmful',
  },
  exposure: 'arm',
  pattern: '{people} assigned to {level}',
  index: ['reminder texts', 31, 240],
  reference: ['no reminder', 36, 238],
};

/** Invented: letters and screening, where higher is better. */
export const UPTAKE: TwoGroups = {
  design: 'trial',
  people: 'women',
  outcome: {
    noun: 'screening uptake',
    verbPhrase: 'took up screening',
    timeFrame: '12 weeks',
    desirability: 'beneficial',
  },
  exposure: 'arm',
  pattern: '{people} sent {level}',
  index: ['a reminder letter', 231, 410],
  reference: ['no letter', 172, 405],
};

/** Invented: a harbour supper, with nobody ill in the reference group. */
export const SUPPER: TwoGroups = {
  design: 'cohort',
  people: 'guests',
  outcome: {
    noun: 'illness',
    verbPhrase: 'fell ill',
    timeFrame: '48 hours',
    desirability: 'harmful',
  },
  exposure: 'smoked mackerel',
  pattern: '{people} who {level}',
  index: ['ate the smoked mackerel', 21, 34],
  reference: ['did not', 0, 27],
};

/** Invented: late reports by route. */
export const NOTIFIED: TwoGroups = {
  design: 'surveillance',
  people: 'reports',
  outcome: {
    noun: 'a late notification',
    verbPhrase: 'were late',
    timeFrame: null,
    desirability: 'harmful',
  },
  exposure: 'route',
  pattern: '{people} sent {level}',
  index: ['on paper', 96, 310],
  reference: ['by the web form', 41, 622],
};
