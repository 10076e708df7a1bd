import type { CutProfile, StoreCutRequest } from '#shared/api';
import type { CodeBook } from '#shared/code-book';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { CodeBookVersion } from '../../models/code-book/code-book-store';
import type { CutColumn } from '../../models/cut/cut-column-store';
import type { Upload } from '../../models/upload/upload-store';
import type { Unit } from '../../models/unit-of-work';
import { timestamp } from '../../runtime/clock';
import { placeCut } from '../cuts/place-cut';

/** A loading cut that may become ready, and what it becomes. */
export interface FinishedCut {
  readonly upload: Upload & { readonly cutId: string };
  readonly newest: CodeBookVersion | null;
  readonly codeBook: CodeBook;
  readonly request: StoreCutRequest;
  readonly personId: string;
}

/** Makes the cut of an upload ready, in one transaction, unless something changed meanwhile. */
export async function finishCut(
  dependencies: Dependencies,
  { upload, newest, codeBook, request, personId }: FinishedCut,
): Promise<Outcome<{ readonly cutId: string; readonly codeBookId: string }>> {
  const { database, clock } = dependencies;
  const { studyId, cutId } = upload;
  return database.unitOfWork(`study:${studyId}`, async (unit) => {
    const change = { state: 'stored', updatedAt: timestamp(clock) } as const;
    if (!(await database.stores.uploads.update(upload.id, 'profiled', change, unit))) {
      return refuse('uploadNotReady');
    }
    const { dataSetId, dataSetName, dataDate } = request;
    const placed = await placeCut(
      dependencies,
      {
        cutId,
        studyId,
        personId,
        dataSetId,
        dataSetName,
        dataDate,
        codeBook,
        newest,
        profile: await profileWithIds(dependencies, upload, unit),
      },
      unit,
    );
    return placed.ok ? { ok: true, value: { cutId, ...placed.value } } : placed;
  });
}

/** The profile speaks of columns by the ids that the code book gave them. */
async function profileWithIds(
  { database }: Dependencies,
  { cutId, profile }: FinishedCut['upload'],
  unit: Unit,
): Promise<CutProfile> {
  if (profile === null) throw new Error(`The file of cut ${cutId} has no profile.`);
  const columns = await database.stores.cutColumns.list(cutId, unit);
  const idOf = newIds(profile, columns);
  return {
    ...profile,
    columns: profile.columns.map((column) => ({ ...column, columnId: idOf(column.columnId) })),
    warnings: profile.warnings.map((warning) => ({
      ...warning,
      columnId: warning.columnId === null ? null : idOf(warning.columnId),
    })),
  };
}

function newIds(profile: CutProfile, columns: readonly CutColumn[]): (id: string) => string {
  const ids = new Map(
    profile.columns.map(({ columnId }, position) => [columnId, columns[position]?.columnId]),
  );
  return (id) => ids.get(id) ?? id;
}
