import { expect, it } from 'vitest';
import { composeReport, createComposer } from '#shared/report';
import { houseStyle, phrasebook } from '../builders/house-styles';
import { analyses, largeReport } from './large-report';
import { report as tell, timed } from './measure';

const SETTING = { houseStyle: houseStyle(), phrasebook: phrasebook() };

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
