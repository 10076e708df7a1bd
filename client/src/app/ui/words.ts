import type { StudyDesign } from '#shared/effects/study-design';
import type { StudyRole } from '#shared/permissions';

/** What designs are called on screen. */
export const DESIGN_WORDS: Readonly<Record<StudyDesign, string>> = {
  cohort: 'Cohort',
  trial: 'Trial',
  caseControl: 'Case–control',
  crossSectional: 'Cross-sectional',
  surveillance: 'Surveillance',
};

/** What roles are called, and what they may do in one line. */
export const ROLE_WORDS: Readonly<Record<StudyRole, { name: string; may: string }>> = {
  reader: { name: 'Reader', may: 'reads the proof and downloads drafts' },
  writer: { name: 'Writer', may: 'writes prose and effect sentences, and sets the framing' },
  analyst: { name: 'Analyst', may: 'loads data, defines analyses, places tables and figures' },
  editor: { name: 'Editor', may: 'edits words and keeps the house style' },
  lead: { name: 'Lead', may: 'does everything, and decides who else may' },
};

/** "1 report", "3 reports" */
export function counted(count: number, one: string, many: string): string {
  return `${count} ${count === 1 ? one : many}`;
}
