import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, beforeEach, expect } from 'vitest';
import type { CodeBookView, DataSetView } from '#shared/api';
import type { CodeBook, CodeBookColumn } from '#shared/code-book';
import type { Tally } from '#shared/tally';
import type { Stores } from '../../server/models/stores';
import type { Study } from '../../server/models/study/study-store';
import type { User } from '../../server/models/user/user-store';
import { uploadPath } from '../../server/services/uploads/upload-files';
import type { Browser } from './browser';
import { startTestApplication, type TestApplication } from './test-application';

/** An id that nothing has. */
export const NOTHING = '0198c0de-0000-7000-8000-000000000000';

/** A small file with one record a row. */
export const ROWS = 'sex,age,ill\nf,31,yes\nm,45,no\nf,28,no\nm,,yes\n';

/** What the tests of data share: an application, and before each test a study with an analyst. */
export interface DataStudy {
  readonly application: TestApplication;
  /** Ada Analyst's browser. */
  readonly browser: Browser;
  readonly study: Study;
  readonly stores: Stores;
  /** The address of something in the study. */
  readonly at: (path: string) => string;
  /** Goes on with another study, in which Ada is an analyst too. */
  readonly moveToAnotherStudy: () => Promise<void>;
  readonly dataSets: () => Promise<readonly DataSetView[]>;
  readonly codeBook: (dataSetId: string) => Promise<CodeBookView>;
  readonly tally: (cutId: string, ...columnIds: readonly string[]) => Promise<Tally>;
  /** Whether the bytes of an upload are still kept. */
  readonly keepsFile: (uploadId: string) => boolean;
}

/** Prepares and ends what a test file about data needs. */
export function useDataStudy(): DataStudy {
  let application: TestApplication;
  let analyst: User;
  let study: Study;
  let browser: Browser;

  const begin = async (): Promise<void> => {
    study = await application.addStudy();
    await application.addMember(study, analyst, 'analyst');
  };
  beforeAll(async () => {
    application = await startTestApplication();
    analyst = await application.addPerson({ name: 'Ada Analyst' });
    browser = await application.signedIn(analyst);
  });
  beforeEach(begin);
  afterEach(() => {
    expect(application.bugs).toEqual([]);
  });
  afterAll(async () => {
    await application.close();
  });

  const at = (path: string): string => `/api/studies/${study.id}${path}`;
  return {
    get application() {
      return application;
    },
    get browser() {
      return browser;
    },
    get study() {
      return study;
    },
    get stores() {
      return application.dependencies.database.stores;
    },
    at,
    moveToAnotherStudy: begin,
    dataSets: async () => (await browser.get(at('/data-sets'))).body as DataSetView[],
    codeBook: async (dataSetId) =>
      (await browser.get(at(`/data-sets/${dataSetId}/code-book`))).body as CodeBookView,
    tally: async (cutId, ...columnIds) =>
      (await browser.post(at(`/cuts/${cutId}/tallies`), { columnIds })).body as Tally,
    keepsFile: (id) =>
      existsSync(join(application.dependencies.config.dataDirectory, uploadPath(id))),
  };
}

/** The column of a code book with this id. */
export function columnOf(book: CodeBook, id: string): CodeBookColumn {
  const column = book.columns.find((one) => one.id === id);
  if (column === undefined) throw new Error(`The code book has no column ${id}.`);
  return column;
}
