/** Roles a person may hold on a study, one at a time. */
export const STUDY_ROLES = ['reader', 'writer', 'analyst', 'editor', 'lead'] as const;

/** One of the study roles. */
export type StudyRole = (typeof STUDY_ROLES)[number];

/** Everything that a role may or may not do on a study. */
export const STUDY_ACTIONS = [
  'readStudy',
  'downloadDraft',
  'editData',
  'editNumbersBlocks',
  'editWordsBlocks',
  'setFraming',
  'editHouseStyle',
  'manageStudy',
  'manageMembers',
  'seeRecords',
  'destroyCut',
] as const;

/** One of the study actions. */
export type StudyAction = (typeof STUDY_ACTIONS)[number];

const WORDS: readonly StudyAction[] = [
  'readStudy',
  'downloadDraft',
  'editWordsBlocks',
  'setFraming',
];
const NUMBERS: readonly StudyAction[] = ['editData', 'editNumbersBlocks', 'seeRecords'];

/** The one table of who may do what on a study. */
export const PERMISSIONS: Readonly<Record<StudyRole, readonly StudyAction[]>> = {
  reader: ['readStudy', 'downloadDraft'],
  writer: WORDS,
  analyst: [...WORDS, ...NUMBERS],
  editor: [...WORDS, 'editHouseStyle'],
  lead: STUDY_ACTIONS,
};

/** Whether a role may do an action on its study. */
export function mayDo(role: StudyRole, action: StudyAction): boolean {
  return PERMISSIONS[role].includes(action);
}
