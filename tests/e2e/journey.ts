import { expect, type Page } from '@playwright/test';
import { BenchPage, type Contrast } from './pages/bench-page';
import type { CodeBookEditor } from './pages/code-book-editor';
import { DeskPage, type StudyWords } from './pages/desk-page';
import { type CountLayout, NewCutPage } from './pages/new-cut-page';
import { ReportPage } from './pages/report-page';
import { type OutcomeWords, StudyPage } from './pages/study-page';
import { dataFile } from './reference';

/** The way of one data set from its file to a report. */
export interface Journey {
  readonly study: StudyWords;
  readonly outcome: OutcomeWords;
  readonly file: string;
  readonly layout: CountLayout;
  /** What is settled in the code book before the cut is made. */
  readonly describe: (codeBook: CodeBookEditor) => Promise<void>;
  readonly contrast: Contrast;
  /** What is looked at on the bench before the analysis is saved. */
  readonly onBench?: (bench: BenchPage) => Promise<void>;
  readonly report: string;
}

/** Goes the whole way by the pages: study, outcome, file, code book, analysis, report. */
export async function fromFileToReport(page: Page, journey: Journey): Promise<ReportPage> {
  const desk = new DeskPage(page);
  const study = new StudyPage(page);
  await desk.open();
  await desk.beginStudy(journey.study);
  await study.wordOutcome(journey.outcome);
  await study.goTo('Data');
  await loadFile(page, journey);
  const bench = new BenchPage(page);
  await bench.pick(journey.contrast);
  await journey.onBench?.(bench);
  await bench.save(journey.report);
  await bench.beginReport(journey.report);
  const report = new ReportPage(page);
  await expect(report.block('Table 1')).toBeVisible();
  return report;
}

async function loadFile(page: Page, { file, layout, describe, study }: Journey): Promise<void> {
  const cut = new NewCutPage(page);
  await cut.open();
  await cut.upload(dataFile(file));
  await expect(cut.read).toBeVisible({ timeout: 30_000 });
  await cut.goTo('Columns');
  await expect(cut.layout(layout)).toBeChecked();
  await cut.goTo('Code book');
  await describe(cut.codeBook);
  await cut.make({ name: study.title, date: '2026-03-31' });
  await cut.startAnalysis();
}
