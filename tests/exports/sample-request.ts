import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { addressKey } from '#shared/analysis';
import type { ValueAddress } from '#shared/analysis';
import type { Block, PinnedAnalysis } from '#shared/report';
import { markdownToDocument, plainDocument } from '#shared/report/text';
import type { InlineNode, TextDocument } from '#shared/report/text';
import type { ExportRequest } from '../../server/exports/export-request';
import { houseStyle, phrasebook, type HOUSE_STYLE_IDS } from '../builders/house-styles';
import { blockOf, composed, pinned, reportOf } from '../builders/reports';
import { admissions, ageByClass, spectacles, wetWork } from '../wording/stratified-scenarios';
import { SAMPLE_CODE_BOOK } from './sample-code-book';

/** Fonts of figures, unpacked once for all tests. */
export const TEST_FONTS = join(tmpdir(), 'evenhand-test-fonts');

/** The analyses of the sample: two strata, four with an empty one, six, cases and controls. */
export const SAMPLE_PINS: readonly PinnedAnalysis[] = [
  pinned(wetWork(), 'a1'),
  { ...pinned(ageByClass(), 'a2'), name: 'Survival by age' },
  { ...pinned(spectacles('two'), 'a3'), name: 'Spectacles by screen use' },
  { ...pinned(admissions(), 'a4'), name: 'Admission by gender' },
];

/** A report with every kind of block, as an export is asked for. */
export function sampleRequest(
  styleId: (typeof HOUSE_STYLE_IDS)[number] = 'open-clinical',
): ExportRequest {
  const style = houseStyle(styleId);
  const report = reportOf(sampleBlocks(), SAMPLE_PINS);
  return {
    report: composed({ ...report, title: 'Wet work and hand eczema' }, SAMPLE_PINS, style),
    houseStyle: style,
    phrasebook: phrasebook(),
    pins: SAMPLE_PINS,
    codeBooks: [{ dataSetName: 'Staff survey', number: 2, codeBook: SAMPLE_CODE_BOOK }],
    study: { title: 'Wet work study', invented: true },
    changedAt: '2026-02-03T23:30:00.000Z',
    fontDirectory: TEST_FONTS,
  };
}

function sampleBlocks(): readonly Block[] {
  const [eczema, survival, screens, admission] = SAMPLE_PINS as readonly [
    PinnedAnalysis,
    PinnedAnalysis,
    PinnedAnalysis,
    PinnedAnalysis,
  ];
  return [
    heading('h1', 1, 'Results'),
    blockOf('p1', 'prose', null, { document: opening() }),
    heading('h2', 2, 'Hand eczema'),
    sentence('s1', eczema, 'over6', { kind: 'stratum', stratumId: 'ward' }),
    sentence('s2', eczema, 'over6', { kind: 'pooled' }),
    blockOf('t1', 'stratifiedTable', eczema),
    blockOf('f1', 'groupedBarChart', eczema),
    heading('h3', 3, 'Points to read'),
    blockOf('p2', 'prose', null, { document: listed() }),
    blockOf('t2', 'stratifiedTable', survival),
    sentence('s3', survival, 'child', { kind: 'pooled' }),
    blockOf('t3', 'stratifiedTable', screens),
    blockOf('f2', 'groupedBarChart', screens),
    blockOf('t4', 'stratifiedTable', admission, { layout: 'sideBySide' }),
    blockOf('t5', 'stratifiedTable', null),
  ];
}

function heading(id: string, level: 1 | 2 | 3, text: string): Block {
  return blockOf(id, 'heading', null, { level, document: plainDocument(text) });
}

function sentence(
  id: string,
  analysis: PinnedAnalysis,
  indexLevelId: string,
  scope: ValueAddress['scope'],
): Block {
  return blockOf(id, 'effectSentence', analysis, { indexLevelId, scope });
}

function opening(): TextDocument {
  const address: ValueAddress = {
    analysisId: 'a1',
    quantity: 'counted',
    levelId: null,
    scope: { kind: 'crude' },
    facet: 'value',
  };
  const content: readonly InlineNode[] = [
    { type: 'text', text: 'We followed ' },
    { type: 'boundValue', attrs: { address: addressKey(address), format: 'auto' } },
    { type: 'text', text: ' people for 12 months (' },
    { type: 'crossReference', attrs: { blockId: 't1' } },
    { type: 'text', text: ', ' },
    { type: 'crossReference', attrs: { blockId: 'f1' } },
    { type: 'text', text: '); the data are described ' },
    {
      type: 'text',
      text: 'elsewhere',
      marks: [{ type: 'link', attrs: { href: 'https://example.org/data?a=1&b=2' } }],
    },
    { type: 'text', text: '. Water is H' },
    { type: 'text', text: '2', marks: [{ type: 'subscript' }] },
    { type: 'text', text: 'O, ' },
    { type: 'text', text: 'bold', marks: [{ type: 'strong' }] },
    { type: 'text', text: ' and ' },
    { type: 'text', text: 'slanted', marks: [{ type: 'em' }] },
    { type: 'hardBreak' },
    { type: 'text', text: 'on a second line.' },
  ];
  return { type: 'doc', content: [{ type: 'paragraph', content }] };
}

function listed(): TextDocument {
  return markdownToDocument(
    '1. First point\n2. Second point\n   - a part of it\n   - another part\n3. Third point\n\nThen:\n\n1. A list of its own',
  );
}
