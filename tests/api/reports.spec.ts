import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { ReportSummary, ReportView, StepsView } from '#shared/api';
import { composeReport, placeAfter, visibleBlocks, type Step } from '#shared/report';
import type { Study } from '../../server/models/study/study-store';
import type { User } from '../../server/models/user/user-store';
import { movePins } from '../../server/services/reports/move-pins';
import { composeStoredReport } from '../../server/services/reports/compose-stored-report';
import { verifyTrail } from '../../server/services/trail/verify-trail';
import type { Browser } from '../builders/browser';
import { phrasebook } from '../builders/house-styles';
import { blockOf } from '../builders/reports';
import { wardResult, wetWorkResult } from '../builders/results';
import { storeAnalysis, type StoredAnalysis } from '../builders/stored-analysis';
import { startTestApplication, type TestApplication } from '../builders/test-application';

let application: TestApplication;
let lead: User;
let study: Study;
let browser: Browser;
let report: ReportView['report'];

beforeAll(async () => {
  application = await startTestApplication();
  lead = await application.addPerson({ name: 'Lena Lead' });
  browser = await application.signedIn(lead);
});

beforeEach(async () => {
  study = await application.addStudy();
  await application.addMember(study, lead, 'lead');
  const created = await browser.post(at('/reports'), { title: 'Twelve-month results' });
  report = (created.body as ReportView).report;
});

afterEach(() => {
  expect(application.bugs).toEqual([]);
});

afterAll(async () => {
  await application.close();
});

function at(path: string): string {
  return `/api/studies/${study.id}${path}`;
}

function inReport(path = ''): string {
  return at(`/reports/${report.id}${path}`);
}

async function viewed(by: Browser = browser): Promise<ReportView> {
  return (await by.get(inReport())).body as ReportView;
}

interface Sent {
  readonly id?: string;
  readonly undoes?: string;
  readonly by?: Browser;
}

async function send(steps: Step | readonly Step[], { id, undoes, by = browser }: Sent = {}) {
  const groupId = newId();
  const list = Array.isArray(steps) ? (steps as readonly Step[]) : [steps as Step];
  return by.post(inReport('/steps'), {
    steps: list.map((step) => ({
      id: id ?? newId(),
      groupId,
      undoes: undoes ?? null,
      step,
    })),
  });
}

function newId(): string {
  return application.dependencies.ids.next();
}

function paragraph(text: string): unknown {
  const content = text === '' ? {} : { content: [{ type: 'text', text }] };
  return {
    schemaVersion: 1,
    document: { type: 'doc', content: [{ type: 'paragraph', ...content }] },
  };
}

async function insertProse(id: string, text: string): Promise<void> {
  const { report: present } = await viewed();
  const last = visibleBlocks(present).at(-1)?.id ?? null;
  const { orderKey } = placeAfter(present, last);
  const block = { id, kind: 'prose', orderKey, content: paragraph(text) };
  const response = await send({ kind: 'insertBlock', block });
  expect(response.body).toMatchObject({ seq: present.seq + 1 });
}

function typing(blockId: string, baseVersion: number, from: number, text: string): Step {
  const slice = { content: [{ type: 'text', text }] };
  const steps = [{ stepType: 'replace', from, to: from, slice }];
  return { kind: 'editText', blockId, baseVersion, steps };
}

function textOf(view: ReportView, blockId: string): string {
  const content = view.report.blocks.find(({ id }) => id === blockId)?.content;
  return JSON.stringify(content).match(/"text":"([^"]*)"/u)?.[1] ?? '';
}

describe('a report', () => {
  it('is begun empty, in a house style, and listed', async () => {
    expect(report).toMatchObject({
      studyId: study.id,
      title: 'Twelve-month results',
      framing: 'both',
      houseStyleId: 'open-clinical',
      stage: 'drafting',
      seq: 0,
      blocks: [],
      pins: {},
    });
    await insertProse('b1', 'One');
    const list = (await browser.get(at('/reports'))).body as ReportSummary[];
    expect(list).toMatchObject([
      { id: report.id, blockCount: 1, blockKinds: ['prose'], seq: 1, updatedBy: 'Lena Lead' },
    ]);
    expect((await viewed()).houseStyle).toMatchObject({ id: 'open-clinical' });
  });

  it('is removed by a lead, and gone for everybody', async () => {
    const writer = await application.memberBrowser(study, 'writer');
    expect((await writer.delete(inReport())).status).toBe(403);
    expect((await browser.delete(inReport())).status).toBe(204);
    expect((await browser.get(inReport())).status).toBe(404);
    expect((await browser.get(at('/reports'))).body).toEqual([]);
  });

  it('leaves every change in the trail', async () => {
    await insertProse('b1', 'One');
    const entries = await application.dependencies.database.stores.trail.list(study.id);
    expect(entries.map(({ what }) => what)).toEqual(['report.created', 'report.changed']);
    expect(await verifyTrail(application.dependencies, study.id)).toMatchObject({ whole: true });
  });

  describe('rejects', () => {
    it('an unknown house style', async () => {
      const response = await browser.post(at('/reports'), { title: 'T', houseStyleId: 'none' });
      expect(response.status).toBe(422);
      expect(response.body).toMatchObject({ fields: [{ path: 'houseStyleId' }] });
    });

    it('a report without a title', async () => {
      const response = await browser.post(at('/reports'), { title: '  ' });
      expect(response.body).toMatchObject({
        fields: [{ path: 'title', message: 'Give the report a title.' }],
      });
    });

    it('another study’s report, as if there were none', async () => {
      const other = await application.addStudy();
      await application.addMember(other, lead, 'lead');
      const path = `/api/studies/${other.id}/reports/${report.id}`;
      expect((await browser.get(path)).status).toBe(404);
      expect((await browser.delete(path)).status).toBe(404);
      expect((await browser.get(`${path}/steps`)).status).toBe(404);
      const steps = [{ id: newId(), groupId: newId(), undoes: null, step: SET_BOTH }];
      expect((await browser.post(`${path}/steps`, { steps })).status).toBe(404);
      const draft = { baseVersion: 1, content: paragraph('x') };
      expect((await browser.put(`${path}/drafts/b1`, draft)).status).toBe(404);
      expect((await browser.delete(`${path}/drafts/b1`)).status).toBe(404);
    });
  });
});

const SET_BOTH: Step = { kind: 'setFraming', framing: 'both' };

describe('steps', () => {
  it('are applied in their order, with who made them and what takes them back', async () => {
    await insertProse('b1', 'One');
    const response = await send([
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
      personId: lead.id,
      inverse: { kind: 'setFraming', framing: 'both' },
    });
    const view = await viewed();
    expect(view.report).toMatchObject({
      seq: 5,
      framing: 'absolute',
      title: 'Final results',
      houseStyleId: 'compact-clinical',
    });
    expect(view.houseStyle).toMatchObject({ id: 'compact-clinical' });
    expect(textOf(view, 'b1')).toBe('One and two');
  });

  it('are told after a number', async () => {
    await insertProse('b1', 'One');
    await send([SET_BOTH, SET_BOTH]);
    const all = (await browser.get(inReport('/steps'))).body as StepsView;
    expect(all.steps.map((step) => step.seq)).toEqual([1, 2, 3]);
    const rest = (await browser.get(inReport('/steps?after=2'))).body as StepsView;
    expect(rest).toMatchObject({ seq: 3, steps: [{ seq: 3, step: { kind: 'setFraming' } }] });
  });

  it('are applied once, however often they are sent', async () => {
    await insertProse('b1', 'One');
    const id = newId();
    const step = typing('b1', 1, 4, '!');
    const first = await send(step, { id });
    const again = await send(step, { id });
    expect(again.body).toEqual(first.body);
    expect(textOf(await viewed(), 'b1')).toBe('One!');
  });

  it('are all applied or none', async () => {
    await insertProse('b1', 'One');
    const response = await send([SET_BOTH, { kind: 'removeBlock', blockId: 'zz' }]);
    expect(response.status).toBe(404);
    expect(response.body).toMatchObject({ code: 'blockUnknown' });
    expect((await viewed()).report.seq).toBe(1);
  });

  it('bring typing of two people together where they wrote in different places', async () => {
    await insertProse('b1', 'Risk was higher');
    const writer = await application.memberBrowser(study, 'writer');
    await send(typing('b1', 1, 1, 'The '));
    const response = await send(typing('b1', 1, 16, ' everywhere'), { by: writer });
    expect(response.status).toBe(200);
    expect(response.body).toMatchObject({ steps: [{ step: { baseVersion: 2 } }] });
    expect(textOf(await viewed(), 'b1')).toBe('The Risk was higher everywhere');
  });

  it('undo a step, and say which', async () => {
    await insertProse('b1', 'One');
    const id = newId();
    const made = (await send(typing('b1', 1, 4, ' two'), { id })).body as StepsView;
    const inverse = { ...made.steps[0]?.inverse, baseVersion: 2 } as unknown as Step;
    const undone = await send(inverse, { undoes: id });
    expect(undone.body).toMatchObject({ steps: [{ undoes: id }] });
    expect(textOf(await viewed(), 'b1')).toBe('One');
  });

  it('keep a removed block until it is restored', async () => {
    await insertProse('b1', 'One');
    await send({ kind: 'removeBlock', blockId: 'b1' });
    const removed = (await viewed()).report.blocks[0];
    expect(removed?.removedAt).not.toBeNull();
    await send({ kind: 'restoreBlock', blockId: 'b1' });
    expect(visibleBlocks((await viewed()).report).map(({ id }) => id)).toEqual(['b1']);
  });

  describe('rejects', () => {
    it('an edit over somebody’s newer edit, with both versions', async () => {
      await insertProse('b1', 'Risk was higher');
      const writer = await application.memberBrowser(study, 'writer');
      const replace = (text: string): Step => ({
        kind: 'replaceContent',
        blockId: 'b1',
        baseVersion: 1,
        content: paragraph(text),
      });
      await send(replace('Risk was lower'));
      const response = await send(replace('Risk was raised'), { by: writer });
      expect(response.status).toBe(409);
      expect(response.body).toMatchObject({
        code: 'staleEdit',
        facts: {
          blockId: 'b1',
          yours: paragraph('Risk was raised'),
          theirs: paragraph('Risk was lower'),
          version: 2,
        },
      });
      expect(textOf(await viewed(), 'b1')).toBe('Risk was lower');
    });

    it('typing at one place by two people, with the whole text of each', async () => {
      await insertProse('b1', 'Risk');
      await send(typing('b1', 1, 5, ' fell'));
      await send(typing('b1', 2, 1, 'The '));
      const response = await send(typing('b1', 1, 5, ' rose'));
      expect(response.status).toBe(409);
      expect(response.body).toMatchObject({
        code: 'staleEdit',
        facts: { yours: paragraph('Risk rose'), theirs: paragraph('The Risk fell'), version: 3 },
      });
    });

    it('an edit of a block that was removed, without losing the words', async () => {
      await insertProse('b1', 'One');
      await send({ kind: 'removeBlock', blockId: 'b1' });
      const response = await send(typing('b1', 1, 4, ' two'));
      expect(response.status).toBe(409);
      expect(response.body).toMatchObject({
        code: 'blockRemoved',
        facts: { blockId: 'b1', yours: paragraph('One two') },
      });
    });

    it('a move of a block that somebody moved', async () => {
      await insertProse('b1', 'One');
      const move: Step = {
        kind: 'moveBlock',
        blockId: 'b1',
        basePositionVersion: 1,
        orderKey: 'a5',
      };
      expect((await send(move)).status).toBe(200);
      expect((await send(move)).body).toMatchObject({ status: 409, code: 'staleMove' });
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
      const response = await send(step as Step);
      expect(response.body).toMatchObject({ status, code });
      expect((response.body as { detail?: string }).detail ?? 'A.').toMatch(/^[A-Z“].*[.]$/u);
    });

    it('steps without ids, without steps, and with too many', async () => {
      const step = { id: 'no', groupId: newId(), undoes: null, step: SET_BOTH };
      expect((await browser.post(inReport('/steps'), { steps: [step] })).status).toBe(422);
      expect((await browser.post(inReport('/steps'), { steps: [] })).status).toBe(422);
      expect((await browser.post(inReport('/steps'), {})).status).toBe(422);
      const many = Array.from({ length: 201 }, () => ({ ...step, id: newId() }));
      expect((await browser.post(inReport('/steps'), { steps: many })).status).toBe(422);
      expect((await browser.get(inReport('/steps?after=soon'))).status).toBe(422);
    });

    it('any step once the report is closed', async () => {
      const { sequelize } = application.dependencies.database;
      await sequelize.query(`UPDATE reports SET stage = 'signedOff' WHERE id = '${report.id}'`);
      expect((await send(SET_BOTH)).body).toMatchObject({ status: 409, code: 'reportClosed' });
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
      const by = await application.memberBrowser(study, role);
      const own =
        step.kind === 'insertBlock' ? { ...step, block: { ...step.block, id: role } } : step;
      const { status } = await send(own, { by });
      expect(`${role} ${String(status)}`).toBe(`${role} ${allowed.includes(role) ? '200' : '403'}`);
    }
  });

  it('asks for the rights of the block that a step is about', async () => {
    await send({ kind: 'insertBlock', block: table });
    const writer = await application.memberBrowser(study, 'writer');
    expect((await send({ kind: 'removeBlock', blockId: 't' }, { by: writer })).status).toBe(403);
    const move: Step = { kind: 'moveBlock', blockId: 't', basePositionVersion: 1, orderKey: 'a9' };
    expect((await send(move, { by: writer })).status).toBe(403);
    expect((await send([SET_BOTH, move], { by: writer })).status).toBe(403);
  });
});

describe('pins', () => {
  let analysis: StoredAnalysis;

  beforeEach(async () => {
    analysis = await storeAnalysis(application.dependencies, study, lead, wardResult());
  });

  function tableOf(analysisId: string): Step {
    const content = { ...(blockOf('t', 'stratifiedTable', null).content as object), analysisId };
    const block = { id: 't', kind: 'stratifiedTable', orderKey: 'a0', content };
    return { kind: 'insertBlock', block };
  }

  it('are set by a step of their own before the block that shows the analysis', async () => {
    const response = await send(tableOf(analysis.id));
    const { steps } = response.body as StepsView;
    expect(steps.map(({ step }) => step.kind)).toEqual(['movePin', 'insertBlock']);
    const view = await viewed();
    expect(view.report.pins).toEqual({ [analysis.id]: analysis.resultId });
    expect(view.pins).toMatchObject([
      {
        analysisId: analysis.id,
        number: 'A1',
        name: 'Wet work',
        resultId: analysis.resultId,
        cut: { number: 1, dataDate: '2026-01-31' },
      },
    ]);
  });

  it('are set too when a block turns to another analysis, or a value in prose is bound', async () => {
    await insertProse('p', 'x');
    const address = `${analysis.id}/risk/over6/crude/value`;
    const node = { type: 'boundValue', attrs: { address, format: 'auto' } };
    const steps = [{ stepType: 'replace', from: 1, to: 1, slice: { content: [node] } }];
    await send({ kind: 'editText', blockId: 'p', baseVersion: 1, steps });
    expect((await viewed()).report.pins).toEqual({ [analysis.id]: analysis.resultId });
  });

  it('move in drafts by a step, and stay in reports that are further on', async () => {
    await send(tableOf(analysis.id));
    const newer = await analysis.addResult(wetWorkResult());
    const { dependencies } = application;
    const move = { studyId: study.id, analysisId: analysis.id, resultId: newer, personId: lead.id };
    const moveAll = () =>
      dependencies.database.unitOfWork(`study:${study.id}`, (unit) =>
        movePins(dependencies, move, unit),
      );
    await dependencies.database.sequelize.query(
      `UPDATE reports SET stage = 'inReview' WHERE id = '${report.id}'`,
    );
    await moveAll();
    expect((await viewed()).report.pins).toEqual({ [analysis.id]: analysis.resultId });
    await dependencies.database.sequelize.query(
      `UPDATE reports SET stage = 'drafting' WHERE id = '${report.id}'`,
    );
    await moveAll();
    const view = await viewed();
    expect(view.report.pins).toEqual({ [analysis.id]: newer });
    const { steps } = (await browser.get(inReport('/steps?after=2'))).body as StepsView;
    expect(steps).toMatchObject([{ step: { kind: 'movePin', resultId: newer } }]);
  });

  it('give exports and screen the same elements', async () => {
    await send(tableOf(analysis.id));
    await insertProse('p', 'See the table.');
    const stored = await composeStoredReport(application.dependencies, study.id, report.id);
    const view = await viewed();
    const { houseStyle, pins } = view;
    const onScreen = composeReport({
      report: view.report,
      pins,
      houseStyle,
      phrasebook: phrasebook(),
    });
    expect(stored.ok && stored.value.composed).toEqual(onScreen);
    expect(onScreen.elements.map(({ kind }) => kind)).toEqual(['table', 'paragraph']);
  });

  describe('rejects', () => {
    it('a block of an analysis that is not there', async () => {
      const response = await send(tableOf('nothing'));
      expect(response.body).toMatchObject({ status: 422, code: 'analysisUnknown' });
      expect((await viewed()).report.seq).toBe(0);
    });

    it('a block of another study’s analysis', async () => {
      const other = await application.addStudy();
      const { id } = await storeAnalysis(application.dependencies, other, lead, wardResult());
      expect((await send(tableOf(id))).body).toMatchObject({ code: 'analysisUnknown' });
    });
  });
});

describe('drafts', () => {
  const draft = { baseVersion: 1, content: paragraph('Half a sen') };

  it('are kept for their writer only, until they become a step', async () => {
    await insertProse('b1', 'One');
    const writer = await application.memberBrowser(study, 'writer');
    const put = await writer.put(inReport('/drafts/b1'), draft);
    expect(put.body).toMatchObject({ blockId: 'b1', ...draft });
    expect((await viewed(writer)).drafts).toMatchObject([{ blockId: 'b1', ...draft }]);
    expect((await viewed()).drafts).toEqual([]);
    const step: Step = { kind: 'replaceContent', blockId: 'b1', ...draft };
    await send(step, { by: writer });
    expect((await viewed(writer)).drafts).toEqual([]);
  });

  it('are replaced and forgotten', async () => {
    await insertProse('b1', 'One');
    await browser.put(inReport('/drafts/b1'), draft);
    const later = { ...draft, content: paragraph('Half a sentence') };
    await browser.put(inReport('/drafts/b1'), later);
    expect((await viewed()).drafts).toMatchObject([later]);
    expect((await browser.delete(inReport('/drafts/b1'))).status).toBe(204);
    expect((await browser.delete(inReport('/drafts/b1'))).status).toBe(204);
    expect((await viewed()).drafts).toEqual([]);
  });

  describe('rejects', () => {
    it('a block that is not there, and content that can’t be read', async () => {
      expect((await browser.put(inReport('/drafts/zz'), draft)).status).toBe(404);
      await insertProse('b1', 'One');
      const broken = { baseVersion: 1, content: { document: 'no' } };
      const response = await browser.put(inReport('/drafts/b1'), broken);
      expect(response.body).toMatchObject({ status: 422, code: 'stepNotUsable' });
    });

    it('a draft of numbers by somebody who may only write words', async () => {
      await send({ kind: 'insertBlock', block: blockOf('t', 'stratifiedTable', null) });
      const writer = await application.memberBrowser(study, 'writer');
      const content = blockOf('t', 'stratifiedTable', null).content;
      const response = await writer.put(inReport('/drafts/t'), { baseVersion: 1, content });
      expect(response.status).toBe(403);
    });
  });
});
