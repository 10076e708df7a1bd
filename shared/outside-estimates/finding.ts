/** `refusal` keeps an estimate from being saved; a `caution` and a `note` stand beside it. */
export type OutsideFindingSeverity = 'refusal' | 'caution' | 'note';

/** What the checks of an estimate from elsewhere can find, each with its severity. */
export const OUTSIDE_FINDINGS = {
  numberNotReadable: 'refusal',
  pValueNotReadable: 'refusal',
  ratioNotPositive: 'refusal',
  limitsReversed: 'refusal',
  limitsWithoutValue: 'refusal',
  notSymmetric: 'caution',
  pDisagrees: 'caution',
  referenceChanged: 'caution',
  levelGone: 'caution',
  notGivenByDesign: 'caution',
  otherSide: 'note',
  otherNumber: 'note',
  otherLevel: 'note',
} as const satisfies Readonly<Record<string, OutsideFindingSeverity>>;

/** Id of a finding. */
export type OutsideFindingId = keyof typeof OUTSIDE_FINDINGS;

/** One finding; `facts` are numbers and texts that its sentence names. */
export interface OutsideFinding {
  readonly id: OutsideFindingId;
  readonly severity: OutsideFindingSeverity;
  readonly facts: Readonly<Record<string, string | number>>;
}

/** Makes a finding. */
export function finding(id: OutsideFindingId, facts: OutsideFinding['facts'] = {}): OutsideFinding {
  return { id, severity: OUTSIDE_FINDINGS[id], facts };
}
