import type { CutProfile } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import type { Cut } from '../../models/cut/cut-store';
import { timestamp } from '../../runtime/clock';

/** A new cut to load columns into; whose it is and what it holds is not known yet. */
export function loadingCut({ ids, clock }: Dependencies, personId: string, fileName: string): Cut {
  return {
    id: ids.next(),
    dataSetId: null,
    number: null,
    dataDate: '',
    fileName,
    rows: 0,
    sha256: '',
    state: 'loading',
    profile: emptyProfile(fileName),
    createdAt: timestamp(clock),
    createdBy: personId,
  };
}

function emptyProfile(fileName: string): CutProfile {
  const usedOptions = { delimiter: null, encoding: null, decimalMark: null, sheet: null };
  return { fileName, rows: 0, columns: [], warnings: [], usedOptions, sheets: [] };
}
