import { readFile } from 'node:fs/promises';
import { readImportedRows } from '#shared/outside-estimates';
import type { OutsideEstimate } from '#shared/outside-estimates';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import { sizeInWords } from '../../errors/size-in-words';
import { intakeProblem } from '../../intake/intake-issue';
import { readSmallTable } from '../../intake/read-small-table';
import type { User } from '../../models/user/user-store';
import { addEstimates, type EstimatePlace } from './add-estimates';
import { importMessage } from './import-messages';
import { presentResult } from './present-result';

const MOST_BYTES = 256 * 1024;

/** A file that arrived. */
interface EstimatesFile {
  readonly path: string;
  readonly sizeInBytes: number;
}

/**
 * Puts the estimates of a delimited file beside an analysis: all of them, or none and what is wrong
 * with each line.
 */
export async function importEstimates(
  dependencies: Dependencies,
  person: User,
  place: EstimatePlace,
  file: EstimatesFile,
): Promise<Outcome<readonly OutsideEstimate[]>> {
  const result = await presentResult(dependencies, place.studyId, place.analysisId);
  if (!result.ok) return result;
  if (file.sizeInBytes > MOST_BYTES) {
    return refuse('estimatesFileTooLarge', { facts: { limit: sizeInWords(MOST_BYTES) } });
  }
  const rows = readSmallTable(await readFile(file.path));
  if (!rows.ok) {
    const { message, wayOut } = intakeProblem(rows.issue);
    return refuse('estimatesNotReadable', { detail: `${message} ${wayOut}` });
  }
  const read = readImportedRows(rows.value, result.value);
  if (read.ok) return addEstimates(dependencies, person, place, read.value);
  const fields = read.issue.map((problem) => importMessage(dependencies, problem));
  return refuse('estimatesNotReadable', { fields: fields.slice(0, 50) });
}
