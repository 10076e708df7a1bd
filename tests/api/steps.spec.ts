import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { StepsView } from '#shared/api';
import { visibleBlocks, type Step } from '#shared/report';
import { blockOf } from '../builders/reports';
import {
  openReportDesk,
  proseContent,
  rewriting,
  typing,
  type ReportDesk,
} from '../builders/report-desk';
import { startTestApplication, type TestApplication } from '../builders/test-application';

let application: TestApplication;
let desk: ReportDesk;

beforeAll(async () => {
  application = await startTestApplication();
});

beforeEach(async () => {
  desk = await openReportDesk(application);
});

afterEach(() => {
  expect(application.bugs).toEqual([]);
});

afterAll(async () => {
  await application.close();
});

const SET_BOTH: Step = { kind: 'setFraming', framing: 'both' };

describe('steps', () => {
  it('are applied in their order, with who made them and what takes them back', async () => {
    await desk.insertProse('b1', 'One');
    const response = await desk.send([
      typing('b1', 1, 4, ' and two'),
      { kind: 'setFraming', framing: 'absolute' },
      { kind: 'setTitle', title: 'Final results' },
      { kind: 'setHouseStyle', houseStyleId: 'compact-clinical' },
    ]);
    expect(response.status).toBe(200);
    const { seq, steps } = response.body as StepsView;
    expect(seq).toBe(5);
    expect(steps.map((step) => step.seq)).toEqual([2, 3, 4, 5]);
    expect(steps[1]).toMatchObject({
      person: 'Lena Lead',
      personId: desk.lead.id,
      inverse: { kind: 'setFraming', framing: 'both' },
    });
    const view = await desk.view();
    expect(view.report).toMatchObject({
      seq: 5,
      framing: 'absolute',
      title: 'Final results',
      houseStyleId: 'compact-clinical',
    });
    expect(view.houseStyle).toMatchObject({ id: 'compact-clinical' });
    expect(await desk.wordsOf('b1')).toBe('One and two');
  });

  it('are told after a number', async () => {
    await desk.insertProse('b1', 'One');
    await desk.send([SET_BOTH, SET_BOTH]);
    const all = (await desk.browser.get(desk.inReport('/steps'))).body as StepsView;
    expect(all.steps.map((step) => step.seq)).toEqual([1, 2, 3]);
    const rest = (await desk.browser.get(desk.inReport('/steps?after=2'))).body as StepsView;
    expect(rest).toMatchObject({ seq: 3, steps: [{ seq: 3, step: { kind: 'setFraming' } }] });
  });

  it('are applied once, however often they are sent', async () => {
    await desk.insertProse('b1', 'One');
    const id = application.dependencies.ids.next();
    const step = typing('b1', 1, 4, '!');
    const first = await desk.send(step, { id });
    const again = await desk.send(step, { id });
    expect(again.body).toEqual(first.body);
    expect(await desk.wordsOf('b1')).toBe('One!');
  });

  it('are all applied or none', async () => {
    await desk.insertProse('b1', 'One');
    const response = await desk.send([SET_BOTH, { kind: 'removeBlock', blockId: 'zz' }]);
    expect(response.status).toBe(404);
    expect(response.body).toMatchObject({ code: 'blockUnknown' });
    expect((await desk.view()).report.seq).toBe(1);
  });

  it('bring typing of two people together where they wrote in different places', async () => {
    await desk.insertProse('b1', 'Risk was higher');
    const writer = await application.memberBrowser(desk.study, 'writer');
    await desk.send(typing('b1', 1, 1, 'The '));
    const response = await desk.send(typing('b1', 1, 16, ' everywhere'), { by: writer });
    expect(response.status).toBe(200);
    expect(response.body).toMatchObject({ steps: [{ step: { baseVersion: 2 } }] });
    expect(await desk.wordsOf('b1')).toBe('The Risk was higher everywhere');
  });

  it('undo a step, and say which', async () => {
    await desk.insertProse('b1', 'One');
    const id = application.dependencies.ids.next();
    const made = (await desk.send(typing('b1', 1, 4, ' two'), { id })).body as StepsView;
    const inverse = { ...made.steps[0]?.inverse, baseVersion: 2 } as unknown as Step;
    const undone = await desk.send(inverse, { undoes: id });
    expect(undone.body).toMatchObject({ steps: [{ undoes: id }] });
    expect(await desk.wordsOf('b1')).toBe('One');
  });

  it('keep a removed block until it is restored', async () => {
    await desk.insertProse('b1', 'One');
    await desk.send({ kind: 'removeBlock', blockId: 'b1' });
    const removed = (await desk.view()).report.blocks[0];
    expect(removed?.removedAt).not.toBeNull();
    await desk.send({ kind: 'restoreBlock', blockId: 'b1' });
    expect(visibleBlocks((await desk.view()).report).map(({ id }) => id)).toEqual(['b1']);
  });

  describe('rejects', () => {
    it('an edit over somebody’s newer edit, with both versions', async () => {
      await desk.insertProse('b1', 'Risk was higher');
      const writer = await application.memberBrowser(desk.study, 'writer');
      await desk.send(rewriting('b1', 1, 'Risk was lower'));
      const response = await desk.send(rewriting('b1', 1, 'Risk was raised'), { by: writer });
      expect(response.status).toBe(409);
      expect(response.body).toMatchObject({
        code: 'staleEdit',
        facts: {
          blockId: 'b1',
          yours: proseContent('Risk was raised'),
          theirs: proseContent('Risk was lower'),
          version: 2,
        },
      });
      expect(await desk.wordsOf('b1')).toBe('Risk was lower');
    });

    it('typing at one place by two people, with the whole text of each', async () => {
      await desk.insertProse('b1', 'Risk');
      await desk.send(typing('b1', 1, 5, ' fell'));
      await desk.send(typing('b1', 2, 1, 'The '));
      const response = await desk.send(typing('b1', 1, 5, ' rose'));
      expect(response.status).toBe(409);
      expect(response.body).toMatchObject({
        code: 'staleEdit',
        facts: {
          yours: proseContent('Risk rose'),
          theirs: proseContent('The Risk fell'),
          version: 3,
        },
      });
    });

    it('an edit of a block that was removed, without losing the words', async () => {
      await desk.insertProse('b1', 'One');
      await desk.send({ kind: 'removeBlock', blockId: 'b1' });
      const response = await desk.send(typing('b1', 1, 4, ' two'));
      expect(response.status).toBe(409);
      expect(response.body).toMatchObject({
        code: 'blockRemoved',
        facts: { blockId: 'b1', yours: proseContent('One two') },
      });
    });

    it('a move of a block that somebody moved', async () => {
      await desk.insertProse('b1', 'One');
      const move: Step = {
        kind: 'moveBlock',
        blockId: 'b1',
        basePositionVersion: 1,
        orderKey: 'a5',
      };
      expect((await desk.send(move)).status).toBe(200);
      expect((await desk.send(move)).body).toMatchObject({ status: 409, code: 'staleMove' });
    });

    it.each([
      ['no kind', {}, 422, 'invalidRequest'],
      ['an unknown kind', { kind: 'explode' }, 422, 'stepNotUsable'],
      ['a part missing', { kind: 'removeBlock' }, 422, 'stepNotUsable'],
      [
        'an unknown house style',
        { kind: 'setHouseStyle', houseStyleId: 'x' },
        422,
        'stepNotUsable',
      ],
      ['a pin', { kind: 'movePin', analysisId: 'a', resultId: null }, 409, 'pinsMoveThemselves'],
      [
        'content that its kind can’t read',
        { kind: 'insertBlock', block: { id: 'b', kind: 'prose', orderKey: 'a0', content: {} } },
        422,
        'stepNotUsable',
      ],
      [
        'an unknown kind of block',
        { kind: 'insertBlock', block: { id: 'b', kind: 'poem', orderKey: 'a0', content: {} } },
        422,
        'stepNotUsable',
      ],
    ])('a step with %s', async (_name, step, status, code) => {
      const response = await desk.send(step as Step);
      expect(response.body).toMatchObject({ status, code });
      expect((response.body as { detail?: string }).detail ?? 'A.').toMatch(/^[A-Z“].*[.]$/u);
    });

    it('steps without ids, without steps, and with too many', async () => {
      const step = {
        id: 'no',
        groupId: application.dependencies.ids.next(),
        undoes: null,
        step: SET_BOTH,
      };
      expect((await desk.browser.post(desk.inReport('/steps'), { steps: [step] })).status).toBe(
        422,
      );
      expect((await desk.browser.post(desk.inReport('/steps'), { steps: [] })).status).toBe(422);
      expect((await desk.browser.post(desk.inReport('/steps'), {})).status).toBe(422);
      const many = Array.from({ length: 201 }, () => ({
        ...step,
        id: application.dependencies.ids.next(),
      }));
      expect((await desk.browser.post(desk.inReport('/steps'), { steps: many })).status).toBe(422);
      expect((await desk.browser.get(desk.inReport('/steps?after=soon'))).status).toBe(422);
    });

    it('any step once the report is closed', async () => {
      const { sequelize } = application.dependencies.database;
      await sequelize.query(`UPDATE reports SET stage = 'signedOff' WHERE id = '${desk.reportId}'`);
      expect((await desk.send(SET_BOTH)).body).toMatchObject({ status: 409, code: 'reportClosed' });
    });
  });
});

describe('who may make which step', () => {
  const heading = blockOf('h', 'heading', null);
  const table = blockOf('t', 'stratifiedTable', null);
  const CASES: readonly (readonly [string, Step, readonly string[]])[] = [
    [
      'words blocks',
      { kind: 'insertBlock', block: heading },
      ['writer', 'analyst', 'editor', 'lead'],
    ],
    ['numbers blocks', { kind: 'insertBlock', block: table }, ['analyst', 'lead']],
    ['framing', SET_BOTH, ['writer', 'analyst', 'editor', 'lead']],
    [
      'house style',
      { kind: 'setHouseStyle', houseStyleId: 'compact-clinical' },
      ['editor', 'lead'],
    ],
  ];

  it.each(CASES)('%s', async (_name, step, allowed) => {
    for (const role of ['reader', 'writer', 'analyst', 'editor', 'lead'] as const) {
      const by = await application.memberBrowser(desk.study, role);
      const own =
        step.kind === 'insertBlock' ? { ...step, block: { ...step.block, id: role } } : step;
      const { status } = await desk.send(own, { by });
      expect(`${role} ${String(status)}`).toBe(`${role} ${allowed.includes(role) ? '200' : '403'}`);
    }
  });

  it('asks for the rights of the block that a step is about', async () => {
    await desk.send({ kind: 'insertBlock', block: table });
    const writer = await application.memberBrowser(desk.study, 'writer');
    expect((await desk.send({ kind: 'removeBlock', blockId: 't' }, { by: writer })).status).toBe(
      403,
    );
    const move: Step = { kind: 'moveBlock', blockId: 't', basePositionVersion: 1, orderKey: 'a9' };
    expect((await desk.send(move, { by: writer })).status).toBe(403);
    expect((await desk.send([SET_BOTH, move], { by: writer })).status).toBe(403);
  });
});
