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

const GIVES_RISK: Readonly<Record<StudyDesign, boolean>> = {
  cohort: true,
  trial: true,
  caseControl: false,
  crossSectional: true,
  surveillance: true,
};

/**
 * Whether a design gives risks (or prevalences). Sampling by the outcome, as in a case-control
 * study, fixes the share of events by hand: only odds ratios are left.
 */
export function designGivesRisk(design: StudyDesign): boolean {
  return GIVES_RISK[design];
}
