import type { AnalysisResult, OutcomeWords } from '#shared/analysis';
import type { FactorLevel } from '#shared/code-book';
import type { StudyDesign } from '#shared/effects';
import { analysisOfCounts, level } from './analysis-of-counts';
import type { CountedScenario } from './analysis-of-counts';

const LEVELS = [
  level('none', 'no wet work', 'None'),
  level('under2', 'under 2 hours of wet work', 'Under 2 h'),
  level('over6', 'over 6 hours of wet work', 'Over 6 h'),
];

const PLACES = [place('ward', 'hospital wards'), place('kitchen', 'kitchens')];

const ECZEMA: OutcomeWords = {
  id: 'eczema',
  noun: 'hand eczema',
  verbPhrase: 'developed hand eczema',
  timeFrame: '12 months',
  desirability: 'harmful',
};

const COUNTS = {
  ward: { none: [11, 236], under2: [27, 402], over6: [34, 163] },
  kitchen: { none: [4, 118], under2: [9, 171], over6: [47, 219] },
} as const;

/** Invented: three levels in two workplaces, as a cohort or as another design counts them. */
export function wetWorkResult(
  changes: Partial<CountedScenario['frame']> & { readonly design?: StudyDesign } = {},
): AnalysisResult {
  return analysisOfCounts({
    frame: { ...frame('cohort'), strata: PLACES, strataLabel: 'Workplace', ...changes },
    counts: COUNTS,
  });
}

/** The same counts in one workplace only, without strata. */
export function wardResult(): AnalysisResult {
  return analysisOfCounts({ frame: frame('cohort'), counts: { '': COUNTS.ward } });
}

/** The same counts with nobody at one level of one workplace. */
export function emptyStratumResult(): AnalysisResult {
  return analysisOfCounts({
    frame: { ...frame('cohort'), strata: PLACES, strataLabel: 'Workplace' },
    counts: { ...COUNTS, kitchen: { ...COUNTS.kitchen, none: [0, 0] } },
  });
}

function frame(design: StudyDesign): CountedScenario['frame'] {
  return {
    design,
    peopleNoun: 'workers',
    population: 'hospital and kitchen staff',
    outcome: ECZEMA,
    exposure: {
      columnId: 'wet_work',
      label: 'Wet work per shift',
      sentenceLabel: 'wet work per shift',
      unit: null,
      ordered: true,
      groupPattern: '{people} with {level}',
      levels: LEVELS,
      referenceLevelId: 'none',
    },
  };
}

function place(id: string, label: string): FactorLevel {
  const pattern = '{level}';
  return {
    ...level(id, label),
    within: [{ columnLabel: 'workplace', levelLabel: label, pattern }],
  };
}
