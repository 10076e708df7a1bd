import type { CodeBook } from '#shared/code-book';

/** Invented: what the columns of the sample's data mean. */
export const SAMPLE_CODE_BOOK: CodeBook = {
  schemaVersion: 1,
  layout: { kind: 'records' },
  columns: [
    {
      id: 'wet_work',
      name: 'wetwork',
      kind: 'orderedCategory',
      label: 'Wet work per shift',
      sentenceLabel: 'wet work per shift',
      unit: null,
      levels: [
        { id: 'none', codes: ['0'], label: 'None', sentenceLabel: 'no wet work' },
        { id: 'under2', codes: ['1'], label: 'Under 2 h', sentenceLabel: 'under 2 hours' },
        { id: 'over6', codes: ['4', '5'], label: 'Over 6 h', sentenceLabel: 'over 6 hours' },
      ],
      bands: [],
      missingCodes: [
        { code: '', reason: 'not asked' },
        { code: '9', reason: 'refused' },
      ],
      referenceLevelId: 'none',
    },
    {
      id: 'age',
      name: 'age',
      kind: 'number',
      label: 'Age',
      sentenceLabel: 'age',
      unit: 'years',
      levels: [],
      bands: [
        { id: 'young', lower: null, upper: 40, label: 'Under 40', sentenceLabel: 'under 40' },
        { id: 'old', lower: 40, upper: null, label: '40 or more', sentenceLabel: '40 or more' },
      ],
      missingCodes: [],
      referenceLevelId: 'young',
    },
    {
      id: 'person',
      name: 'person_id',
      kind: 'identifier',
      label: 'Person',
      sentenceLabel: 'person',
      unit: null,
      levels: [],
      bands: [],
      missingCodes: [],
      referenceLevelId: null,
    },
  ],
};
