export { mayDo, PERMISSIONS, STUDY_ACTIONS, STUDY_ROLES } from './permissions';
export type { StudyAction, StudyRole } from './permissions';
