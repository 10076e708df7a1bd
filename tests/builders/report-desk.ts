import type { Response } from 'supertest';
import type { ReportView } from '#shared/api';
import { placeAfter, visibleBlocks, type Step } from '#shared/report';
import { documentToText, plainDocument, type TextDocument } from '#shared/report/text';
import type { Study } from '../../server/models/study/study-store';
import type { User } from '../../server/models/user/user-store';
import type { Browser } from './browser';
import type { TestApplication } from './test-application';

/** How steps are sent: by whom, under which id, undoing what. */
export interface Sending {
  readonly by?: Browser;
  readonly id?: string;
  readonly undoes?: string;
}

/** A new study with one empty report, and a lead who works on it. */
export interface ReportDesk {
  readonly study: Study;
  readonly lead: User;
  readonly browser: Browser;
  readonly reportId: string;
  /** A path below the study. */
  readonly at: (path: string) => string;
  /** A path below the report. */
  readonly inReport: (path?: string) => string;
  readonly view: (by?: Browser) => Promise<ReportView>;
  readonly send: (steps: Step | readonly Step[], sending?: Sending) => Promise<Response>;
  /** Appends a block of prose with one paragraph. */
  readonly insertProse: (id: string, text: string) => Promise<void>;
  /** The words of a block of prose. */
  readonly wordsOf: (id: string) => Promise<string>;
}

/** Adds a study with a lead and a report to an application. */
export async function openReportDesk(application: TestApplication): Promise<ReportDesk> {
  const study = await application.addStudy();
  const lead = await application.addPerson({ name: 'Lena Lead' });
  await application.addMember(study, lead, 'lead');
  const browser = await application.signedIn(lead);
  const at = (path: string): string => `/api/studies/${study.id}${path}`;
  const created = await browser.post(at('/reports'), { title: 'Twelve-month results' });
  const reportId = (created.body as ReportView).report.id;
  const inReport = (path = ''): string => at(`/reports/${reportId}${path}`);
  const view: ReportDesk['view'] = async (by = browser) =>
    (await by.get(inReport())).body as ReportView;
  const send: ReportDesk['send'] = (steps, { by = browser, ...more } = {}) =>
    sendSteps(by, inReport('/steps'), application.dependencies.ids.next, steps, more);
  const insertProse = async (id: string, text: string): Promise<void> => {
    const { report } = await view();
    const { orderKey } = placeAfter(report, visibleBlocks(report).at(-1)?.id ?? null);
    const block = { id, kind: 'prose', orderKey, content: proseContent(text) };
    const response = await send({ kind: 'insertBlock', block });
    if (response.status !== 200) throw new Error(`The prose was refused: ${response.text}`);
  };
  const wordsOf = async (id: string): Promise<string> => {
    const block = (await view()).report.blocks.find((one) => one.id === id);
    return documentToText((block?.content as { document: TextDocument }).document);
  };
  return { study, lead, browser, reportId, at, inReport, view, send, insertProse, wordsOf };
}

/** The content of prose with one paragraph. */
export function proseContent(text: string): { readonly document: TextDocument } {
  const content = { schemaVersion: 1, document: plainDocument(text) };
  return content;
}

/** A step that types text into a block of prose. */
export function typing(blockId: string, baseVersion: number, at: number, text: string): Step {
  const slice = { content: [{ type: 'text', text }] };
  const steps = [{ stepType: 'replace', from: at, to: at, slice }];
  return { kind: 'editText', blockId, baseVersion, steps };
}

/** A step that replaces the content of a block of prose. */
export function rewriting(blockId: string, baseVersion: number, text: string): Step {
  return { kind: 'replaceContent', blockId, baseVersion, content: proseContent(text) };
}

async function sendSteps(
  by: Browser,
  path: string,
  newId: () => string,
  steps: Step | readonly Step[],
  { id, undoes }: Omit<Sending, 'by'>,
): Promise<Response> {
  const groupId = newId();
  const list = Array.isArray(steps) ? (steps as readonly Step[]) : [steps as Step];
  return by.post(path, {
    steps: list.map((step) => ({
      id: id ?? newId(),
      groupId,
      undoes: undoes ?? null,
      step,
    })),
  });
}
