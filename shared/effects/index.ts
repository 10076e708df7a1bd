export type { EffectMeasure, EffectScale, ExactFraction } from './effect-measure';
export { EFFECT_MEASURES, hasHomogeneity, hasInterval, hasPooling } from './effect-measures';
export { EFFECT_MEASURE_IDS } from './measure-ids';
export type { EffectMeasureId } from './measure-ids';
export { numberNeeded } from './number-needed';
export type { NumberNeeded, NumberNeededSide } from './number-needed';
export { STUDY_DESIGNS, designGivesRisk } from './study-design';
export type { StudyDesign } from './study-design';
