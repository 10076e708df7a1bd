/** Study designs; they decide which measures, nouns and verbs may be used. */
export const STUDY_DESIGNS = [
  'cohort',
  'trial',
  'caseControl',
  'crossSectional',
  'surveillance',
] as const;

/** One of the study designs. */
export type StudyDesign = (typeof STUDY_DESIGNS)[number];
