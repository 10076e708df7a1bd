import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { StudyView } from '#shared/api';
import type { Study } from '../../server/models/study/study-store';
import type { User } from '../../server/models/user/user-store';
import { verifyTrail } from '../../server/services/trail/verify-trail';
import type { Browser } from '../builders/browser';
import { mailedToken } from '../builders/mailed-token';
import { startTestApplication, type TestApplication } from '../builders/test-application';

const NEW_STUDY = { title: 'Evening screens', design: 'caseControl', peopleNoun: 'patients' };
const OUTCOME = {
  id: 'hand-eczema',
  noun: 'hand eczema',
  verbPhrase: 'developed hand eczema',
  timeFrame: '12 months',
  desirability: 'harmful',
};
const MILESTONE = { id: 'first-draft', title: 'First draft', dueDate: '2026-05-01' };

let application: TestApplication;
let lead: User;
let study: Study;
let browser: Browser;

beforeAll(async () => {
  application = await startTestApplication();
  lead = await application.addPerson({ name: 'Lena Lead' });
  browser = await application.signedIn(lead);
});

beforeEach(async () => {
  study = await application.addStudy();
  await application.addMember(study, lead, 'lead');
});

afterEach(() => {
  expect(application.bugs).toEqual([]);
});

afterAll(async () => {
  await application.close();
});

function at(path = ''): string {
  return `/api/studies/${study.id}${path}`;
}

async function viewed(): Promise<StudyView> {
  return (await browser.get(at())).body as StudyView;
}

async function whatTrailSays(): Promise<readonly string[]> {
  const entries = await application.dependencies.database.stores.trail.list(study.id);
  expect(await verifyTrail(application.dependencies, study.id)).toMatchObject({ whole: true });
  return entries.map(({ what }) => what);
}

describe('a study', () => {
  it('is begun by anybody, who is its lead then', async () => {
    const response = await browser.post('/api/studies', NEW_STUDY);
    expect(response.status).toBe(201);
    const made = response.body as StudyView;
    expect(made).toMatchObject({
      ...NEW_STUDY,
      role: 'lead',
      invented: false,
      latestCutNumber: null,
      reportCount: 0,
      population: '',
      outcomes: [],
      milestones: [],
      members: [{ personId: lead.id, name: 'Lena Lead', initials: 'LL', role: 'lead' }],
    });
    const list = (await browser.get('/api/studies')).body as { id: string }[];
    expect(list.map(({ id }) => id)).toContain(made.id);
    const { trail } = application.dependencies.database.stores;
    expect(await trail.head(made.id)).toMatchObject({ number: 1, what: 'study.created' });
  });

  it('is listed for its members only, with their role', async () => {
    const reader = await application.memberBrowser(study, 'reader');
    expect((await reader.get('/api/studies')).body).toMatchObject([
      { id: study.id, role: 'reader' },
    ]);
    const stranger = await application.signedIn(await application.addPerson());
    expect((await stranger.get('/api/studies')).body).toEqual([]);
  });

  it('is shown with its latest ready cut and its reports that stand', async () => {
    const { database } = application.dependencies;
    const { sequelize } = database;
    const now = application.clock.now().toISOString();
    const insert = (table: string, row: Record<string, unknown>) =>
      sequelize.getQueryInterface().bulkInsert(table, [row]);
    await insert('data_sets', { id: 'd', study_id: study.id, name: 'Staff', created_at: now });
    const cut = { data_set_id: 'd', data_date: '2026-03-31', file_name: 'a.csv', rows: 1 };
    const rest = { sha256: '', profile: '{}', created_at: now, created_by: lead.id };
    await insert('cuts', { id: 'c1', number: 1, state: 'ready', ...cut, ...rest });
    await insert('cuts', { id: 'c2', number: 2, state: 'loading', ...cut, ...rest });
    const report = { study_id: study.id, title: 'R', seq: 0, framing: 'both', stage: 'drafting' };
    const more = { house_style_id: 's', settings_version: 1, created_at: now, updated_at: now };
    await insert('reports', { id: 'r1', ...report, ...more });
    await insert('reports', { id: 'r2', ...report, ...more, removed_at: now });
    expect(await viewed()).toMatchObject({ latestCutNumber: 1, reportCount: 1 });
  });

  it('changes its words; what is left out stays, and what is the same leaves no trail', async () => {
    const response = await browser.patch(at(), { title: 'Dry work' });
    expect(response.body).toMatchObject({ title: 'Dry work', design: 'cohort' });
    await browser.patch(at(), { title: 'Dry work' });
    expect(await whatTrailSays()).toEqual(['study.changed']);
  });
});

describe('outcomes', () => {
  it('are added, changed in place and removed, by leads and analysts', async () => {
    const analyst = await application.memberBrowser(study, 'analyst');
    const second = { ...OUTCOME, id: 'other', noun: 'asthma' };
    await browser.put(at(`/outcomes/${OUTCOME.id}`), OUTCOME);
    await analyst.put(at('/outcomes/other'), second);
    const changed = { ...OUTCOME, noun: 'eczema of the hands' };
    const response = await browser.put(at(`/outcomes/${OUTCOME.id}`), changed);
    expect((response.body as StudyView).outcomes).toEqual([changed, second]);
    await browser.put(at(`/outcomes/${OUTCOME.id}`), changed);
    const removed = await browser.delete(at('/outcomes/other'));
    expect((removed.body as StudyView).outcomes).toEqual([changed]);
    expect(await whatTrailSays()).toEqual([
      'outcome.added',
      'outcome.added',
      'outcome.changed',
      'outcome.removed',
    ]);
  });

  it('of another study stay as they are, even under the same id', async () => {
    await browser.put(at(`/outcomes/${OUTCOME.id}`), OUTCOME);
    const other = await application.addStudy();
    await application.addMember(other, lead, 'lead');
    await browser.put(`/api/studies/${other.id}/outcomes/${OUTCOME.id}`, {
      ...OUTCOME,
      noun: 'something else',
    });
    expect((await viewed()).outcomes).toEqual([OUTCOME]);
  });
});

describe('milestones', () => {
  it('are added, changed and removed', async () => {
    await browser.put(at(`/milestones/${MILESTONE.id}`), MILESTONE);
    const later = { ...MILESTONE, dueDate: '2026-06-01' };
    const response = await browser.put(at(`/milestones/${MILESTONE.id}`), later);
    expect((response.body as StudyView).milestones).toEqual([later]);
    const removed = await browser.delete(at(`/milestones/${MILESTONE.id}`));
    expect((removed.body as StudyView).milestones).toEqual([]);
    expect(await whatTrailSays()).toEqual([
      'milestone.added',
      'milestone.changed',
      'milestone.removed',
    ]);
  });
});

describe('members', () => {
  it('with an account are added at once, without a mail', async () => {
    const person = await application.addPerson({ name: 'Wanda Words' });
    const request = { email: person.email.toUpperCase(), role: 'writer' };
    const response = await browser.post(at('/members'), request);
    expect((response.body as StudyView).members[1]).toMatchObject({
      personId: person.id,
      initials: 'WW',
      role: 'writer',
    });
    const theirs = await application.signedIn(person);
    expect((await theirs.get(at())).body).toMatchObject({ role: 'writer' });
  });

  it('without an account get one, and an invitation that names the study', async () => {
    const request = { email: 'new.person@example.org', role: 'editor' };
    expect((await browser.post(at('/members'), request)).status).toBe(200);
    const token = await mailedToken(application, request.email);
    const newcomer = await application.browser();
    const completion = { token, newPassword: 'the first one of mine' };
    await newcomer.post('/api/password-resets/completion', completion);
    await newcomer.signIn(request.email, completion.newPassword);
    expect((await newcomer.get(at())).body).toMatchObject({ role: 'editor' });
    const mails = await application.dependencies.database.stores.mail.newest(10);
    expect(
      mails.some(({ text }) => text.includes('Lena Lead added you to the study "Wet work"')),
    ).toBe(true);
  });

  it('get another role, and leave', async () => {
    const person = await application.addPerson();
    await application.addMember(study, person, 'reader');
    const theirs = await application.signedIn(person);
    await browser.put(at(`/members/${person.id}`), { role: 'editor' });
    expect((await theirs.get(at())).body).toMatchObject({ role: 'editor' });
    await browser.delete(at(`/members/${person.id}`));
    expect((await theirs.get(at())).status).toBe(404);
    expect(await whatTrailSays()).toEqual(['member.roleChanged', 'member.removed']);
  });

  it('who are leads can step down when there is another', async () => {
    const other = await application.addPerson();
    await application.addMember(study, other, 'lead');
    const response = await browser.put(at(`/members/${lead.id}`), { role: 'writer' });
    expect(response.body).toMatchObject({ role: 'writer' });
    expect((await browser.patch(at(), { title: 'X' })).status).toBe(403);
  });
});

describe('GET /api/studies rejects', () => {
  it('people who are not signed in', async () => {
    const nobody = await application.browser();
    expect((await nobody.get('/api/studies')).body).toMatchObject({ code: 'signInNeeded' });
  });
});

describe('POST /api/studies rejects', () => {
  it('an unknown design and missing words', async () => {
    const response = await browser.post('/api/studies', { title: '', design: 'survey' });
    expect(response.body).toMatchObject({
      status: 422,
      fields: [
        { path: 'title', message: 'Give the study a title.' },
        {
          path: 'design',
          message: 'This must be one of: cohort, trial, caseControl, crossSectional, surveillance.',
        },
        { path: 'peopleNoun', message: 'This is needed.' },
      ],
    });
  });
});

describe('GET /api/studies/:studyId rejects', () => {
  it.each(['nothing', '%00', "' OR 1=1", '../studies'])('the id %s', async (id) => {
    const response = await browser.get(`/api/studies/${encodeURIComponent(id)}`);
    expect(response.body).toMatchObject({ status: 404, code: 'notFound' });
  });

  it('an address that is not encoded right', async () => {
    const response = await browser.get('/api/studies/%E0%A4%A');
    expect(response.body).toMatchObject({ status: 400, code: 'unreadableRequest' });
  });
});

describe('PATCH /api/studies/:studyId rejects', () => {
  it('a title that is taken away', async () => {
    const response = await browser.patch(at(), { title: '   ' });
    expect(response.body).toMatchObject({ status: 422, fields: [{ path: 'title' }] });
    expect((await viewed()).title).toBe('Wet work');
  });
});

describe('PUT /api/studies/:studyId/outcomes/:outcomeId rejects', () => {
  it('another id in the body than in the address', async () => {
    const response = await browser.put(at('/outcomes/another'), OUTCOME);
    expect(response.body).toMatchObject({ status: 422, fields: [{ path: 'id' }] });
  });

  it('an outcome without words', async () => {
    const response = await browser.put(at('/outcomes/x'), { ...OUTCOME, id: 'x', noun: ' ' });
    expect(response.body).toMatchObject({
      fields: [{ path: 'noun', message: 'Name the outcome, as in "hand eczema".' }],
    });
  });
});

describe('DELETE /api/studies/:studyId/outcomes/:outcomeId rejects', () => {
  it('an outcome that is not there', async () => {
    expect((await browser.delete(at('/outcomes/nothing'))).status).toBe(404);
  });

  it('an outcome that an analysis counts, and names the analysis', async () => {
    await browser.put(at(`/outcomes/${OUTCOME.id}`), OUTCOME);
    await addAnalysis({ outcome: { outcomeId: OUTCOME.id } });
    const response = await browser.delete(at(`/outcomes/${OUTCOME.id}`));
    expect(response.body).toMatchObject({
      status: 409,
      code: 'outcomeInUse',
      title: 'An analysis uses this outcome: Wet hands.',
    });
    expect((await viewed()).outcomes).toHaveLength(1);
  });
});

async function addAnalysis(specification: object): Promise<void> {
  const { database, ids } = application.dependencies;
  const queries = database.sequelize.getQueryInterface();
  const now = application.clock.now().toISOString();
  const [dataSet, cut, analysis] = [ids.next(), ids.next(), ids.next()];
  await queries.bulkInsert('data_sets', [
    { id: dataSet, study_id: study.id, name: 'Staff', created_at: now },
  ]);
  const file = { data_date: '2026-03-31', file_name: 'a.csv', rows: 1, sha256: '', profile: '{}' };
  const made = { created_at: now, created_by: lead.id };
  await queries.bulkInsert('cuts', [
    { id: cut, data_set_id: dataSet, number: 1, state: 'ready', ...file, ...made },
  ]);
  const row = { id: analysis, study_id: study.id, number: 1, name: 'Wet hands', version: 1 };
  await queries.bulkInsert('analyses', [{ ...row, created_at: now, updated_at: now }]);
  const version = { analysis_id: analysis, number: 1, name: 'Wet hands', cut_id: cut };
  const by = { person_id: lead.id, at: now, specification: JSON.stringify(specification) };
  await queries.bulkInsert('analysis_versions', [{ ...version, ...by }]);
}

describe('PUT /api/studies/:studyId/milestones/:milestoneId rejects', () => {
  it('a date that does not exist, and another id than in the address', async () => {
    const wrongDate = { ...MILESTONE, dueDate: '2026-02-30' };
    const response = await browser.put(at(`/milestones/${MILESTONE.id}`), wrongDate);
    expect(response.body).toMatchObject({
      fields: [{ path: 'dueDate', message: 'Give a date such as 2026-03-31.' }],
    });
    expect((await browser.put(at('/milestones/other'), MILESTONE)).status).toBe(422);
  });
});

describe('DELETE /api/studies/:studyId/milestones/:milestoneId rejects', () => {
  it('a milestone that is not there', async () => {
    expect((await browser.delete(at('/milestones/nothing'))).status).toBe(404);
  });
});

describe('POST /api/studies/:studyId/members rejects', () => {
  it('somebody who is a member already', async () => {
    const response = await browser.post(at('/members'), { email: lead.email, role: 'reader' });
    expect(response.body).toMatchObject({ status: 409, code: 'memberExists' });
  });

  it('somebody whose account is switched off', async () => {
    const person = await application.addPerson({ disabled: true });
    const response = await browser.post(at('/members'), { email: person.email, role: 'reader' });
    expect(response.body).toMatchObject({ status: 409, code: 'accountDisabled' });
  });

  it('a role that does not exist', async () => {
    const response = await browser.post(at('/members'), { email: 'x@example.org', role: 'owner' });
    expect(response.body).toMatchObject({ status: 422, fields: [{ path: 'role' }] });
  });
});

describe('PUT /api/studies/:studyId/members/:personId rejects', () => {
  it('taking the role from the last lead who can sign in', async () => {
    const off = await application.addPerson({ disabled: true });
    await application.addMember(study, off, 'lead');
    const response = await browser.put(at(`/members/${lead.id}`), { role: 'writer' });
    expect(response.body).toMatchObject({ status: 409, code: 'lastLead' });
    expect(await viewed()).toMatchObject({ role: 'lead' });
  });

  it('somebody who is no member', async () => {
    const person = await application.addPerson();
    const response = await browser.put(at(`/members/${person.id}`), { role: 'writer' });
    expect(response.status).toBe(404);
  });
});

describe('DELETE /api/studies/:studyId/members/:personId rejects', () => {
  it('the last lead', async () => {
    const response = await browser.delete(at(`/members/${lead.id}`));
    expect(response.body).toMatchObject({ status: 409, code: 'lastLead' });
    expect((await viewed()).members).toHaveLength(1);
  });

  it('somebody who is no member', async () => {
    expect((await browser.delete(at('/members/nobody'))).status).toBe(404);
  });
});
