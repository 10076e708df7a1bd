import type { CodeBookView, CutView, DataSetView, UploadView } from '#shared/api';
import type { CodeBookVersion } from '../../models/code-book/code-book-store';
import type { Upload } from '../../models/upload/upload-store';
import type { ViewedCut } from '../../services/cuts/view-cut';
import type { ListedDataSet } from '../../services/data-sets/list-data-sets';
import type { Unchanging } from '../route';

/** An upload as people see it; its cut shows once it is stored. */
export function presentUpload(upload: Upload): Unchanging<UploadView> {
  const { id, fileName, state, progress, rowsRead, profile, proposal, problem } = upload;
  return {
    id,
    fileName,
    state,
    progress,
    rowsRead,
    profile,
    proposedCodeBook: proposal?.codeBook ?? null,
    differences: proposal?.differences ?? [],
    problem,
    cutId: state === 'stored' ? upload.cutId : null,
    dataSetId: upload.dataSetId,
  };
}

/** A version of a code book as people see it. */
export function presentCodeBook(version: CodeBookVersion): Unchanging<CodeBookView> {
  const { dataSetId, number, content } = version;
  return { dataSetId, number, content };
}

/** A data set with its cuts. */
export function presentDataSet(dataSet: ListedDataSet): Unchanging<DataSetView> {
  return dataSet;
}

/** A cut with its profile. */
export function presentCut(cut: ViewedCut): Unchanging<CutView> {
  return cut;
}
