import type { CutProfile } from '#shared/api';
import type { CodeBook } from '#shared/code-book';
import type { Dependencies } from '../../dependencies';
import type { Outcome } from '../../errors/server-issue';
import type { CodeBookVersion } from '../../models/code-book/code-book-store';
import type { Unit } from '../../models/unit-of-work';
import { timestamp } from '../../runtime/clock';
import { addCodeBook } from '../code-books/add-code-book';
import { isSameContent } from '../code-books/same-content';
import { refuseStaleCodeBook } from '../code-books/refuse-stale';
import { recordStudyChange } from '../studies/record-study-change';

/** A loading cut, and the place that it gets. */
export interface CutPlacement {
  readonly cutId: string;
  readonly studyId: string;
  readonly personId: string;
  /** An existing data set, or null for a new one of this name. */
  readonly dataSetId: string | null;
  readonly dataSetName: string;
  readonly dataDate: string;
  readonly profile: CutProfile;
  readonly codeBook: CodeBook;
  /** The code book that was the newest when the cut was checked. */
  readonly newest: CodeBookVersion | null;
}

/**
 * Gives a loading cut its data set, its number and its code book, and makes it ready.
 *
 * Refused when the code book of the data set changed meanwhile.
 */
export async function placeCut(
  dependencies: Dependencies,
  placement: CutPlacement,
  unit: Unit,
): Promise<Outcome<{ readonly codeBookId: string }>> {
  const { cuts } = dependencies.database.stores;
  const { cutId, studyId, personId, dataDate, profile } = placement;
  const dataSetId = placement.dataSetId ?? (await addDataSet(dependencies, placement, unit));
  const codeBook = await storeCodeBook(dependencies, dataSetId, placement, unit);
  if (!codeBook.ok) return codeBook;
  const number = await cuts.nextNumber(dataSetId, unit);
  const createdAt = timestamp(dependencies.clock);
  const ready = { dataSetId, number, dataDate, profile, createdAt, createdBy: personId };
  await cuts.makeReady(cutId, ready, unit);
  const after = { cut: cutId, dataSet: dataSetId, number, dataDate, fileName: profile.fileName };
  const change = { studyId, personId, what: 'cut.stored', before: null, after };
  await recordStudyChange(dependencies, change, unit);
  return { ok: true, value: { codeBookId: codeBook.value } };
}

async function addDataSet(
  { database, ids, clock }: Dependencies,
  { studyId, dataSetName }: CutPlacement,
  unit: Unit,
): Promise<string> {
  const id = ids.next();
  const dataSet = { id, studyId, name: dataSetName, createdAt: timestamp(clock) };
  await database.stores.dataSets.insert(dataSet, unit);
  return id;
}

/** Gives the id of the code book that holds now; refused when somebody stored another one. */
async function storeCodeBook(
  dependencies: Dependencies,
  dataSetId: string,
  { codeBook, newest, personId }: CutPlacement,
  unit: Unit,
): Promise<Outcome<string>> {
  const present = await dependencies.database.stores.codeBooks.newest(dataSetId, unit);
  if (present !== null && present.id !== newest?.id) return refuseStaleCodeBook(present, codeBook);
  if (present !== null && isSameContent(present.content, codeBook)) {
    return { ok: true, value: present.id };
  }
  const number = (present?.number ?? 0) + 1;
  const version = { dataSetId, number, content: codeBook, createdBy: personId };
  return { ok: true, value: await addCodeBook(dependencies, version, unit) };
}
