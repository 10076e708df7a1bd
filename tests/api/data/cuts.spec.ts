import { describe, expect, it } from 'vitest';
import type { RecordsPage } from '#shared/api';
import { replaceColumn } from '#shared/code-book';
import { columnOf, NOTHING, ROWS, useDataStudy } from '../../builders/data-study';
import { loadFile, readUpload } from '../../builders/uploads';

const data = useDataStudy();

describe('a data cut', () => {
  it('is counted under the code book of its data set', async () => {
    const cut = await loadFile(data.browser, data.study, { bytes: ROWS });
    expect(await data.tally(cut.id, 'sex', 'ill')).toEqual({
      axes: [
        { columnId: 'sex', levelIds: ['f', 'm'] },
        { columnId: 'ill', levelIds: ['yes', 'no'] },
      ],
      cells: [
        { at: [0, 0], count: 1 },
        { at: [0, 1], count: 1 },
        { at: [1, 0], count: 1 },
        { at: [1, 1], count: 1 },
      ],
      counted: 4,
      restricted: 0,
      leftOut: [],
    });
  });

  it('is counted under restrictions, and tells what was left out', async () => {
    const cut = await loadFile(data.browser, data.study, { bytes: 'sex,ill\nf,yes\nf,\nm,no\nf,NA\n' });
    const restrictions = [{ columnId: 'sex', levelIds: ['f'] }];
    const response = await data.browser.post(data.at(`/cuts/${cut.id}/tallies`), {
      columnIds: ['ill'],
      restrictions,
    });
    expect(response.body).toMatchObject({
      counted: 1,
      restricted: 1,
      leftOut: [
        { columnId: 'ill', reason: 'Blank', count: 1 },
        { columnId: 'ill', reason: 'Not available', count: 1 },
      ],
    });
  });

  it('is not counted anew when levels get other labels or another order', async () => {
    const cut = await loadFile(data.browser, data.study, { bytes: ROWS });
    const before = await data.tally(cut.id, 'sex');
    const stored = await data.application.dependencies.database.sequelize.query(
      'SELECT hash FROM tallies WHERE cut_id = :cut',
      { replacements: { cut: cut.id } },
    );
    const { content, number } = await data.codeBook(cut.dataSetId);
    const sex = columnOf(content, 'sex');
    const levels = [...sex.levels]
      .reverse()
      .map((level) => ({ ...level, label: `The ${level.label}` }));
    await data.browser.put(data.at(`/data-sets/${cut.dataSetId}/code-book`), {
      baseNumber: number,
      content: replaceColumn(content, { ...sex, levels }),
    });
    const after = await data.tally(cut.id, 'sex');
    expect(after.axes[0]?.levelIds).toEqual(['m', 'f']);
    expect(after.cells).toEqual(
      [...before.cells].reverse().map(({ count }, place) => ({ at: [place], count })),
    );
    expect(
      await data.application.dependencies.database.sequelize.query(
        'SELECT hash FROM tallies WHERE cut_id = :cut',
        { replacements: { cut: cut.id } },
      ),
    ).toEqual(stored);
  });

  it('shows its records as they stood in the file, page by page', async () => {
    const cut = await loadFile(data.browser, data.study, { bytes: ROWS });
    const page = async (query: string) =>
      (await data.browser.get(data.at(`/cuts/${cut.id}/records${query}`))).body as RecordsPage;
    expect(await page('?offset=1&limit=2')).toEqual({
      columns: ['sex', 'age', 'ill'],
      rows: [
        ['m', '45', 'no'],
        ['f', '28', 'no'],
      ],
      offset: 1,
      total: 4,
    });
    expect((await page('')).rows).toHaveLength(4);
    expect((await page('?offset=9')).rows).toEqual([]);
  });

  it('does not change once it is ready, whoever asks', async () => {
    const cut = await loadFile(data.browser, data.study, { bytes: ROWS });
    const { sequelize } = data.application.dependencies.database;
    const replacements = { cut: cut.id };
    await expect(
      sequelize.query('UPDATE cuts SET rows = 1 WHERE id = :cut', { replacements }),
    ).rejects.toThrow();
    await expect(
      sequelize.query("UPDATE column_chunks SET bytes = x'00' WHERE cut_id = :cut", {
        replacements,
      }),
    ).rejects.toThrow();
    await expect(
      sequelize.query("INSERT INTO column_chunks VALUES (:cut, 9, 'codes', 0, x'00')", {
        replacements,
      }),
    ).rejects.toThrow();
  });
});

describe('GET /api/studies/:studyId/data-sets rejects', () => {
  it('whoever is no member', async () => {
    const stranger = await data.application.signedIn(await data.application.addPerson());
    expect((await stranger.get(data.at('/data-sets'))).status).toBe(404);
  });
});

describe('GET /api/studies/:studyId/cuts/:cutId rejects', () => {
  it('a cut that is not there, not ready, or of another study', async () => {
    const cut = await loadFile(data.browser, data.study, { bytes: ROWS });
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    const loading = (await data.stores.uploads.find(data.study.id, upload.id))?.cutId;
    expect((await data.browser.get(data.at(`/cuts/${NOTHING}`))).status).toBe(404);
    expect((await data.browser.get(data.at(`/cuts/${String(loading)}`))).status).toBe(404);
    await data.moveToAnotherStudy();
    expect((await data.browser.get(data.at(`/cuts/${cut.id}`))).status).toBe(404);
  });
});

describe('GET /api/studies/:studyId/cuts/:cutId/records rejects', () => {
  it('who may not see single records', async () => {
    const cut = await loadFile(data.browser, data.study, { bytes: ROWS });
    for (const role of ['reader', 'writer', 'editor'] as const) {
      const member = await data.application.memberBrowser(data.study, role);
      expect((await member.get(data.at(`/cuts/${cut.id}/records`))).status).toBe(403);
    }
  });

  it('a window that is none, and a cut of another study', async () => {
    const cut = await loadFile(data.browser, data.study, { bytes: ROWS });
    const window = '?offset=-1&limit=many';
    const response = await data.browser.get(data.at(`/cuts/${cut.id}/records${window}`));
    expect(response.status).toBe(422);
    await data.moveToAnotherStudy();
    expect((await data.browser.get(data.at(`/cuts/${cut.id}/records`))).status).toBe(404);
  });
});

describe('POST /api/studies/:studyId/cuts/:cutId/tallies rejects', () => {
  it.each<[string, object, string]>([
    ['unknownColumn', { columnIds: ['gone'] }, 'The code book has no column "gone".'],
    [
      'columnTwice',
      { columnIds: ['sex', 'sex'] },
      '"Sex" was chosen twice. Choose different columns.',
    ],
    [
      'columnIsNoFactor',
      { columnIds: ['age'] },
      '"Age" has no levels to count by. Make it a category, or band its numbers.',
    ],
    [
      'unknownLevel',
      { columnIds: ['sex'], restrictions: [{ columnId: 'ill', levelIds: ['gone'] }] },
      '"Ill" has no level "gone" any more. Choose another one.',
    ],
  ])('%s', async (issue, request, detail) => {
    const ages = Array.from({ length: 12 }, (_, age) => `f,${String(30 + age)},yes`).join('\n');
    const cut = await loadFile(data.browser, data.study, { bytes: `${ROWS}${ages}\n` });
    const response = await data.browser.post(data.at(`/cuts/${cut.id}/tallies`), request);
    expect([response.status, response.body]).toMatchObject([
      422,
      { code: 'countsNotUsable', detail, facts: { issue } },
    ]);
  });

  it('a request without columns, and a cut that is not there', async () => {
    const cut = await loadFile(data.browser, data.study, { bytes: ROWS });
    const response = await data.browser.post(data.at(`/cuts/${cut.id}/tallies`), { columnIds: [] });
    expect(response.status).toBe(422);
    expect(
      (await data.browser.post(data.at(`/cuts/${NOTHING}/tallies`), { columnIds: ['sex'] })).status,
    ).toBe(404);
  });
});

