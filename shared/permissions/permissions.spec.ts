import { describe, expect, it } from 'vitest';
import { mayDo, STUDY_ACTIONS, STUDY_ROLES, type StudyAction } from './permissions';

/** Columns in the order of STUDY_ROLES: reader, writer, analyst, editor, lead. */
const AS_DECIDED: Readonly<Record<StudyAction, string>> = {
  readStudy: 'yes yes yes yes yes',
  downloadDraft: 'yes yes yes yes yes',
  editData: 'no no yes no yes',
  editNumbersBlocks: 'no no yes no yes',
  editWordsBlocks: 'no yes yes yes yes',
  setFraming: 'no yes yes yes yes',
  editHouseStyle: 'no no no yes yes',
  manageStudy: 'no no no no yes',
  manageMembers: 'no no no no yes',
  seeRecords: 'no no yes no yes',
  destroyCut: 'no no no no yes',
};

describe('who may do what on a study', () => {
  it.each(STUDY_ACTIONS)('%s', (action) => {
    const answers = STUDY_ROLES.map((role) => (mayDo(role, action) ? 'yes' : 'no'));
    expect(answers.join(' ')).toBe(AS_DECIDED[action]);
  });
});
