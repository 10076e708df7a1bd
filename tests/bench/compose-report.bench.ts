import { expect, it } from 'vitest';
import {
  composeReport,
  createComposer,
  type Block,
  type PinnedAnalysis,
  type Report,
} from '#shared/report';
import { houseStyle, phrasebook } from '../builders/house-styles';
import { blockOf, pinned, reportOf } from '../builders/reports';
import { wardResult, wetWorkResult } from '../builders/results';
import { report as tell, timed } from './measure';

const SETTING = { houseStyle: houseStyle(), phrasebook: phrasebook() };

/** Analyses that are read anew, so that nothing remembered about a result helps. */
function analyses(): readonly PinnedAnalysis[] {
  const results = [wetWorkResult(), wardResult()];
  return Array.from({ length: 20 }, (_, index) =>
    structuredClone(pinned(results[index % 2]!, `a${String(index)}`)),
  );
}

/** A report of this many blocks, three in ten of them tables. */
function largeReport(blocks: number, pins: readonly PinnedAnalysis[]): Report {
  const made = Array.from({ length: blocks }, (_, index) =>
    blockAt(index, pins[index % pins.length]!),
  );
  return reportOf(made, pins);
}

const KINDS = [
  'stratifiedTable',
  'prose',
  'effectSentence',
  'stratifiedTable',
  'prose',
  'groupedBarChart',
  'effectSentence',
  'heading',
  'stratifiedTable',
  'prose',
] as const;

function blockAt(index: number, analysis: PinnedAnalysis): Block {
  const id = `b${String(index)}`;
  const kind = KINDS[index % KINDS.length]!;
  if (kind !== 'prose') return blockOf(id, kind, analysis);
  const address = `${analysis.analysisId}/risk/over6/crude/value`;
  const content = [
    { type: 'text', text: 'Over 12 months the risk was ' },
    { type: 'boundValue', attrs: { address, format: 'withLimits' } },
    { type: 'text', text: ', as the table shows: ' },
    { type: 'crossReference', attrs: { blockId: `b${String(index - 1)}` } },
  ];
  const document = { type: 'doc', content: [{ type: 'paragraph', content }] };
  return blockOf(id, kind, null, { document });
}

it('composes a report of 200 blocks with 60 tables', () => {
  const sample = largeReport(200, analyses());
  expect(sample.blocks.filter(({ kind }) => kind === 'stratifiedTable')).toHaveLength(60);
  const timing = timed(
    () => {
      const pins = analyses();
      return { report: largeReport(200, pins), pins, ...SETTING };
    },
    (request) => composeReport(request),
  );
  const printed = JSON.stringify(composeReport({ report: sample, pins: analyses(), ...SETTING }));
  const floor = timed(
    () => printed,
    (text) => JSON.parse(text) as unknown,
  );
  tell({
    what: 'compose a report of 200 blocks with 60 tables',
    budgetInMilliseconds: 100,
    timing,
    floor: { what: 'reading its elements as JSON', timing: floor },
  });
});

it('toggles the framing of a report of 60 blocks', () => {
  const timing = timed(
    () => {
      const pins = analyses();
      const composer = createComposer();
      const report = largeReport(60, pins);
      composer.compose({ report, pins, ...SETTING });
      return {
        composer,
        request: { report: { ...report, framing: 'absolute' as const }, pins, ...SETTING },
      };
    },
    ({ composer, request }) => composer.compose(request),
  );
  tell({
    what: 'compose 60 blocks again after the framing was toggled',
    budgetInMilliseconds: 25,
    timing,
    floor: null,
  });
});

it('composes a report of 200 blocks again after one keystroke', () => {
  const pins = analyses();
  const composer = createComposer();
  const report = largeReport(200, pins);
  composer.compose({ report, pins, ...SETTING });
  const timing = timed(
    (run) => {
      const document = {
        type: 'doc',
        content: [{ type: 'paragraph', content: [{ type: 'text', text: `x${String(run)}` }] }],
      };
      const blocks = report.blocks.map((block) =>
        block.id === 'b1' ? { ...block, content: { schemaVersion: 1, document } } : block,
      );
      return { report: { ...report, blocks }, pins, ...SETTING };
    },
    (request) => composer.compose(request),
  );
  tell({
    what: 'compose 200 blocks again after one keystroke',
    budgetInMilliseconds: 5,
    timing,
    floor: null,
  });
});
