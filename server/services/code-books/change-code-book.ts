import type { CodeBookChangeRequest } from '#shared/api';
import { validateCodeBook, type CodeBook } from '#shared/code-book';
import { tallyIssueMessage } from '#shared/tally';
import type { Dependencies } from '../../dependencies';
import { refuse, refuseField, type Outcome } from '../../errors/server-issue';
import type { CodeBookVersion } from '../../models/code-book/code-book-store';
import type { Study } from '../../models/study/study-store';
import type { Unit } from '../../models/unit-of-work';
import type { User } from '../../models/user/user-store';
import { repinReports } from '../analyses/recompute-analyses';
import { recordStudyChange } from '../studies/record-study-change';
import { addCodeBook } from './add-code-book';
import { codeBookProblems } from './code-book-problems';
import { refuseStaleCodeBook } from './refuse-stale';
import { isSameContent } from './same-content';
import { viewCodeBook } from './view-code-book';

/**
 * Stores a new version of a code book, and recomputes the analyses of its data set.
 *
 * Refused when somebody stored a newer version than the one it was made from, when it contradicts
 * itself, and when the rows of a cut can't be counted as it says. The same content changes nothing.
 */
export async function changeCodeBook(
  dependencies: Dependencies,
  person: User,
  study: Study,
  dataSetId: string,
  request: CodeBookChangeRequest,
): Promise<Outcome<CodeBookVersion>> {
  const present = await viewCodeBook(dependencies, study.id, dataSetId);
  if (!present.ok) return present;
  const { number, content } = present.value;
  if (number !== request.baseNumber) return refuseStaleCodeBook(present.value, request.content);
  if (isSameContent(content, request.content)) return present;
  const fit = await checkFit(dependencies, dataSetId, request.content);
  if (!fit.ok) return fit;
  const stored = await dependencies.database.unitOfWork(`study:${study.id}`, (unit) =>
    store(dependencies, person, study.id, present.value, request.content, unit),
  );
  if (!stored.ok) return stored;
  await repinReports(dependencies, person.id, study, dataSetId);
  return viewCodeBook(dependencies, study.id, dataSetId);
}

async function checkFit(
  { database, counting }: Dependencies,
  dataSetId: string,
  codeBook: CodeBook,
): Promise<Outcome<undefined>> {
  const problems = codeBookProblems(validateCodeBook(codeBook), 'content');
  if (problems.length > 0) return refuse('invalidRequest', { fields: problems });
  for (const { id, number } of await database.stores.cuts.listReady(dataSetId)) {
    const issue = await counting.checkCounts(id, codeBook);
    if (issue === null) continue;
    const message = `In cut ${String(number)}: ${tallyIssueMessage(issue)}`;
    return refuseField('content.layout', message);
  }
  return { ok: true, value: undefined };
}

async function store(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  present: CodeBookVersion,
  content: CodeBook,
  unit: Unit,
): Promise<Outcome<string>> {
  const { dataSetId } = present;
  const newest = await dependencies.database.stores.codeBooks.newest(dataSetId, unit);
  if (newest !== null && newest.id !== present.id) return refuseStaleCodeBook(newest, content);
  const number = present.number + 1;
  const version = { dataSetId, number, content, createdBy: person.id };
  const id = await addCodeBook(dependencies, version, unit);
  const before = { dataSet: dataSetId, codeBook: present.number };
  const after = { dataSet: dataSetId, codeBook: number };
  const change = { studyId, personId: person.id, what: 'codeBook.changed', before, after };
  await recordStudyChange(dependencies, change, unit);
  return { ok: true, value: id };
}
