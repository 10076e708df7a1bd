export { EFFECT_MEASURE_IDS } from './measure-ids';
export type { EffectMeasureId } from './measure-ids';
export { STUDY_DESIGNS } from './study-design';
export type { StudyDesign } from './study-design';
