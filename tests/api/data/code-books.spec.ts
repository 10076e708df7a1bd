import { describe, expect, it } from 'vitest';
import { replaceColumn, setLayout } from '#shared/code-book';
import { columnOf, NOTHING, ROWS, useDataStudy } from '../../builders/data-study';
import { loadFile } from '../../builders/uploads';

const data = useDataStudy();

describe('a code book', () => {
  it('gets a new version for every change, and none for the same content', async () => {
    const { dataSetId } = await loadFile(data.browser, data.study, { bytes: ROWS });
    const { content } = await data.codeBook(dataSetId);
    const changed = replaceColumn(content, { ...columnOf(content, 'age'), label: 'Age in years' });
    const url = data.at(`/data-sets/${dataSetId}/code-book`);
    const response = await data.browser.put(url, { baseNumber: 1, content: changed });
    expect(response.body).toEqual({ dataSetId, number: 2, content: changed });
    expect((await data.browser.put(url, { baseNumber: 2, content: changed })).body).toMatchObject({
      number: 2,
    });
    const trail = await data.stores.trail.list(data.study.id);
    expect(trail.map(({ what }) => what)).toEqual(['cut.stored', 'codeBook.changed']);
  });
});

describe('GET /api/studies/:studyId/data-sets/:dataSetId/code-book rejects', () => {
  it('a data set that is not there', async () => {
    expect((await data.browser.get(data.at(`/data-sets/${NOTHING}/code-book`))).status).toBe(404);
  });
});

describe('PUT /api/studies/:studyId/data-sets/:dataSetId/code-book rejects', () => {
  it('an edit over a newer version, and shows both', async () => {
    const { dataSetId } = await loadFile(data.browser, data.study, { bytes: ROWS });
    const { content } = await data.codeBook(dataSetId);
    const labelled = (label: string) =>
      replaceColumn(content, { ...columnOf(content, 'sex'), label });
    const url = data.at(`/data-sets/${dataSetId}/code-book`);
    await data.browser.put(url, { baseNumber: 1, content: labelled('Sex at birth') });
    const response = await data.browser.put(url, { baseNumber: 1, content: labelled('Gender') });
    expect([response.status, response.body]).toMatchObject([
      409,
      {
        code: 'staleCodeBook',
        facts: {
          number: 2,
          yours: labelled('Gender'),
          theirs: { dataSetId, number: 2, content: labelled('Sex at birth') },
        },
      },
    ]);
    expect(await data.codeBook(dataSetId)).toMatchObject({
      number: 2,
      content: labelled('Sex at birth'),
    });
  });

  it('levels that overlap, and counts that the data do not have', async () => {
    const { dataSetId } = await loadFile(data.browser, data.study, { bytes: ROWS });
    const { content } = await data.codeBook(dataSetId);
    const url = data.at(`/data-sets/${dataSetId}/code-book`);
    const sex = columnOf(content, 'sex');
    const doubled = [...sex.levels, { ...sex.levels[0]!, id: 'again' }];
    const overlap = await data.browser.put(url, {
      baseNumber: 1,
      content: replaceColumn(content, { ...sex, levels: doubled }),
    });
    expect(overlap.body).toMatchObject({
      code: 'invalidRequest',
      fields: [{ path: 'content.columns.0.levels.2.codes' }],
    });
    const counted = setLayout(content, { kind: 'count', columnId: 'age' });
    const counts = await data.browser.put(url, { baseNumber: 1, content: counted });
    expect(counts.body).toMatchObject({
      fields: [
        {
          path: 'content.layout',
          message:
            'In cut 1: Row 4 of the count column "Age" is blank, and every row has to have a count.',
        },
      ],
    });
  });

  it('a data set that is not there', async () => {
    const { dataSetId } = await loadFile(data.browser, data.study, { bytes: ROWS });
    const { content } = await data.codeBook(dataSetId);
    const body = { baseNumber: 1, content };
    const response = await data.browser.put(data.at(`/data-sets/${NOTHING}/code-book`), body);
    expect(response.status).toBe(404);
  });
});
