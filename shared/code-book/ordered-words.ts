/** Words of scales whose order everybody knows, lowest first, in lower case. */
export const ORDERED_WORDS: readonly (readonly string[])[] = [
  ['none', 'very low', 'low', 'medium', 'moderate', 'high', 'very high'],
  ['none', 'absent', 'minimal', 'slight', 'mild', 'moderate', 'severe', 'very severe'],
  ['never', 'former', 'ex', 'past', 'current'],
  ['never', 'rarely', 'seldom', 'sometimes', 'often', 'usually', 'always'],
  ['very poor', 'poor', 'fair', 'good', 'very good', 'excellent'],
  ['small', 'medium', 'large'],
  ['strongly disagree', 'disagree', 'neutral', 'agree', 'strongly agree'],
  ['primary', 'secondary', 'tertiary'],
  ['i', 'ii', 'iii', 'iv', 'v', 'vi', 'vii', 'viii', 'ix', 'x'],
];

/** Labels that stand below every number of an ordered column. */
export const WORDS_FOR_NONE: readonly string[] = ['none', 'never', 'nil', 'zero'];

/** Labels that usually name the group that others are compared with. */
export const WORDS_FOR_REFERENCE: readonly string[] = [
  'no',
  'none',
  'never',
  'control',
  'placebo',
  'unexposed',
  'not exposed',
  'usual care',
  'absent',
  'negative',
  '0',
];

/** Words that are written small inside a sentence. */
export const COMMON_WORDS: readonly string[] = [
  ...new Set([
    ...ORDERED_WORDS.flat().filter((word) => !/^[ivx]+$/.test(word)),
    ...WORDS_FOR_NONE,
    ...WORDS_FOR_REFERENCE,
    'yes',
    'male',
    'female',
    'man',
    'men',
    'woman',
    'women',
    'adult',
    'adults',
    'child',
    'children',
    'case',
    'treatment',
    'exposed',
    'positive',
    'present',
    'other',
  ]),
];
