import type { AnalysisResult, ResultFrame } from '#shared/analysis';
import type { FactorLevel } from '#shared/code-book';
import {
  analysisOfCounts,
  level,
  type Counted,
  type CountedScenario,
} from '../builders/analysis-of-counts';
import { WITH } from './two-group-scenarios';

function nested(columnLabel: string, pattern: string | null, levels: readonly FactorLevel[]) {
  return levels.map((stratum) => ({
    ...stratum,
    within: [{ columnLabel, levelLabel: stratum.sentenceLabel, pattern }],
  }));
}

const WET_WORK: ResultFrame['exposure'] = {
  columnId: 'wet_work',
  label: 'Wet work per shift',
  sentenceLabel: 'wet work per shift',
  unit: null,
  ordered: true,
  groupPattern: WITH,
  levels: [
    level('none', 'no wet work', 'None'),
    level('under2', 'under 2 hours of wet work', 'Under 2 h'),
    level('over6', 'over 6 hours of wet work', 'Over 6 h'),
  ],
  referenceLevelId: 'none',
};

/** Invented: wet work and hand eczema, in two workplaces. */
export function wetWork(
  referenceLevelId = 'none',
  specification: CountedScenario['specification'] = {},
): AnalysisResult {
  return analysisOfCounts({
    frame: {
      design: 'cohort',
      peopleNoun: 'workers',
      population: 'hospital and kitchen staff',
      outcome: {
        id: 'eczema',
        noun: 'hand eczema',
        verbPhrase: 'developed hand eczema',
        timeFrame: '12 months',
        desirability: 'harmful',
      },
      exposure: { ...WET_WORK, referenceLevelId },
      strata: [
        ...nested('workplace', 'on {level}', [level('ward', 'hospital wards', 'Hospital ward')]),
        ...nested('workplace', 'in {level}', [level('kitchen', 'kitchens', 'Kitchen')]),
      ],
      strataLabel: 'Workplace',
    },
    counts: {
      ward: { none: [11, 236], under2: [27, 402], over6: [34, 163] },
      kitchen: { none: [4, 118], under2: [9, 171], over6: [47, 219] },
    },
    specification,
  });
}

const DEPARTMENTS: Readonly<Record<string, readonly [male: Counted, female: Counted]>> = {
  A: [
    [512, 825],
    [89, 108],
  ],
  B: [
    [353, 560],
    [17, 25],
  ],
  C: [
    [120, 325],
    [202, 593],
  ],
  D: [
    [138, 417],
    [131, 375],
  ],
  E: [
    [53, 191],
    [94, 393],
  ],
  F: [
    [22, 373],
    [24, 341],
  ],
};

/**
 * Counts of UCBAdmissions (R's datasets package), with nothing said about the words: what row data
 * reads like before anybody edits the code book.
 */
export function admissions(): AnalysisResult {
  return analysisOfCounts({
    frame: {
      design: 'cohort',
      peopleNoun: 'applicants',
      population: '',
      outcome: {
        id: 'admission',
        noun: 'admission',
        verbPhrase: 'were admitted',
        timeFrame: null,
        desirability: 'beneficial',
      },
      exposure: {
        columnId: 'gender',
        label: 'Gender',
        sentenceLabel: 'gender',
        unit: null,
        ordered: false,
        levels: [level('male', 'Male'), level('female', 'Female')],
        referenceLevelId: 'female',
      },
      strata: nested(
        'department',
        null,
        Object.keys(DEPARTMENTS).map((id) => level(id)),
      ),
      strataLabel: 'Department',
    },
    counts: Object.fromEntries(
      Object.entries(DEPARTMENTS).map(([id, [male, female]]) => [id, { male, female }]),
    ),
  });
}

/** Counts of Titanic (R's datasets package), age by class: the crew had no children. */
export function ageByClass(): AnalysisResult {
  return analysisOfCounts({
    frame: {
      design: 'cohort',
      peopleNoun: 'people',
      population: 'people on board',
      outcome: {
        id: 'survival',
        noun: 'survival',
        verbPhrase: 'survived',
        timeFrame: null,
        desirability: 'beneficial',
      },
      exposure: {
        columnId: 'age',
        label: 'Age',
        sentenceLabel: 'age',
        unit: null,
        ordered: false,
        groupPattern: '{level}',
        levels: [level('adult', 'adults', 'Adult'), level('child', 'children', 'Child')],
        referenceLevelId: 'adult',
      },
      strata: nested('class', 'in {level}', [
        level('first', 'first class', '1st'),
        level('second', 'second class', '2nd'),
        level('third', 'third class', '3rd'),
        level('crew', 'the crew', 'Crew'),
      ]),
      strataLabel: 'Class',
    },
    counts: {
      first: { adult: [197, 319], child: [6, 6] },
      second: { adult: [94, 261], child: [24, 24] },
      third: { adult: [151, 627], child: [27, 79] },
      crew: { adult: [212, 885], child: [0, 0] },
    },
  });
}

/** Invented: evening screens and new spectacles, three levels, in two schools or in one. */
export function spectacles(schools: 'one' | 'two' = 'one'): AnalysisResult {
  const strata =
    schools === 'one'
      ? []
      : nested('school', 'at {level}', [
          level('hill', 'Hill School'),
          level('mill', 'Mill School'),
        ]);
  const all = { under1: [40, 190], one: [70, 230], over3: [100, 220] } as const;
  const split = {
    hill: { under1: [22, 100], one: [30, 110], over3: [45, 100] },
    mill: { under1: [18, 90], one: [40, 120], over3: [55, 120] },
  } as const;
  return analysisOfCounts({
    frame: {
      design: 'caseControl',
      peopleNoun: 'children',
      population: 'children of one town',
      outcome: {
        id: 'spectacles',
        noun: 'new spectacles',
        verbPhrase: 'needed new spectacles',
        timeFrame: null,
        desirability: 'harmful',
      },
      exposure: {
        columnId: 'screen',
        label: 'Evening screen use',
        sentenceLabel: 'evening screen use',
        unit: null,
        ordered: true,
        groupPattern: WITH,
        levels: [
          level('under1', 'under 1 hour of evening screen use', 'Under 1 h'),
          level('one', '1 to 3 hours of evening screen use', '1 to <3 h'),
          level('over3', '3 hours or more of evening screen use', '3 h or more'),
        ],
        referenceLevelId: 'under1',
      },
      strata,
      strataLabel: schools === 'one' ? null : 'School',
    },
    counts: schools === 'one' ? { '': all } : split,
  });
}
