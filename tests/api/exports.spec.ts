import type { Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Step } from '#shared/report';
import { STUDY_ROLES } from '#shared/permissions';
import { elementsNamed, textIn } from '../builders/xml-tree';
import { blockOf } from '../builders/reports';
import { openReportDesk, type ReportDesk } from '../builders/report-desk';
import { wetWorkResult } from '../builders/results';
import { storeAnalysis } from '../builders/stored-analysis';
import { startTestApplication, type TestApplication } from '../builders/test-application';
import { partTree } from '../exports/file-parts';

const NOTHING = '0198c0de-0000-7000-8000-000000000000';
const TIME = 120_000;

let application: TestApplication;
let desk: ReportDesk;

beforeAll(async () => {
  application = await startTestApplication();
  desk = await openReportDesk(application);
  const { dependencies } = application;
  const analysis = await storeAnalysis(dependencies, desk.study, desk.lead, wetWorkResult());
  await desk.insertProse('p', 'Twelve months of water.');
  for (const step of [
    showing('t', 'stratifiedTable', analysis.id),
    showing('f', 'groupedBarChart', analysis.id),
  ]) {
    expect((await desk.send(step)).status).toBe(200);
  }
}, TIME);

afterAll(async () => {
  await application.close();
  expect(application.bugs).toEqual([]);
});

const ORDER = { stratifiedTable: 'a1', groupedBarChart: 'a2' } as const;

function showing(
  id: string,
  kind: 'stratifiedTable' | 'groupedBarChart',
  analysisId: string,
): Step {
  const content = { ...(blockOf(id, kind, null).content as object), analysisId };
  return { kind: 'insertBlock', block: { id, kind, orderKey: ORDER[kind], content } };
}

/** supertest keeps bytes of types that it knows only; these are office files. */
async function download(format: string, browser = desk.browser): Promise<Response> {
  return browser
    .get(desk.inReport(`/exports/${format}`))
    .buffer(true)
    .parse((response, done) => {
      const chunks: Buffer[] = [];
      response.on('data', (chunk: Buffer) => chunks.push(chunk));
      response.on('end', () => {
        done(null, Buffer.concat(chunks));
      });
    });
}

describe('GET /api/studies/:studyId/reports/:reportId/exports/docx', () => {
  it(
    'gives the report as it stands, under its title',
    async () => {
      const response = await download('docx');
      expect(response.status).toBe(200);
      expect(response.type).toContain('wordprocessingml.document');
      expect(response.headers['content-disposition']).toContain('Twelve-month results.docx');
      const body = partTree(response.body as Buffer, 'word/document.xml');
      const text = elementsNamed(body, 'w:t').map(textIn).join('');
      expect(text).toContain('Twelve months of water.');
      expect(text).toContain('34/163');
      expect(elementsNamed(body, 'w:drawing')).toHaveLength(1);
    },
    TIME,
  );

  it(
    'gives the same bytes until the report changes',
    async () => {
      const [one, other] = [await download('docx'), await download('docx')];
      expect((one.body as Buffer).equals(other.body as Buffer)).toBe(true);
      await desk.send({ kind: 'setFraming', framing: 'absolute' });
      expect((await download('docx')).body).not.toEqual(one.body);
    },
    TIME,
  );

  it(
    'is open to every role of the study',
    async () => {
      for (const role of STUDY_ROLES) {
        const response = await download('docx', await application.memberBrowser(desk.study, role));
        expect(response.status, role).toBe(200);
      }
    },
    TIME,
  );
});

describe('GET /api/studies/:studyId/reports/:reportId/exports/xlsx', () => {
  it(
    'gives tables, values and the code book behind them',
    async () => {
      const response = await download('xlsx');
      expect(response.status).toBe(200);
      expect(response.type).toContain('spreadsheetml.sheet');
      const workbook = partTree(response.body as Buffer, 'xl/workbook.xml');
      expect(elementsNamed(workbook, 'sheet').map(({ attributes }) => attributes.name)).toEqual([
        'Table 1',
        'Figure 1',
        'Values',
        'Data dictionary',
        'Notes',
      ]);
    },
    TIME,
  );
});

for (const format of ['docx', 'xlsx']) {
  describe(`an export as ${format}`, () => {
    it('is not found for a report that is not there, or was removed', async () => {
      const missing = desk.at(`/reports/${NOTHING}/exports/${format}`);
      const response = await desk.browser.get(missing);
      expect(response.status).toBe(404);
      expect(response.type).toBe('application/problem+json');
      const created = await desk.browser.post(desk.at('/reports'), { title: 'Gone' });
      const { id } = (created.body as { report: { id: string } }).report;
      await desk.browser.delete(desk.at(`/reports/${id}`));
      const gone = await desk.browser.get(desk.at(`/reports/${id}/exports/${format}`));
      expect(gone.status).toBe(404);
    });
  });
}

describe('GET /api/studies/:studyId/reports/:reportId/exports/docx rejects', () => {
  it(
    'a report of another study',
    async () => {
      await expectNotFoundElsewhere('docx');
    },
    TIME,
  );

  it('a format that is not in the register', async () => {
    expect((await desk.browser.get(desk.inReport('/exports/exe'))).status).toBe(404);
  });
});

describe('GET /api/studies/:studyId/reports/:reportId/exports/xlsx rejects', () => {
  it(
    'a report of another study',
    async () => {
      await expectNotFoundElsewhere('xlsx');
    },
    TIME,
  );
});

/** Somebody who leads another study asks for this report, through either study's address. */
async function expectNotFoundElsewhere(format: string): Promise<void> {
  const other = await openReportDesk(application);
  const through = other.at(`/reports/${desk.reportId}/exports/${format}`);
  expect((await other.browser.get(through)).status).toBe(404);
  expect((await other.browser.get(desk.inReport(`/exports/${format}`))).status).toBe(404);
}
