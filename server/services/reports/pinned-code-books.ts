import type { Report } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import type { ExportedCodeBook } from '../../exports/export-request';

/** The code books that the pinned results of a report were computed under, each once. */
export async function pinnedCodeBooks(
  { database }: Dependencies,
  studyId: string,
  report: Pick<Report, 'pins'>,
): Promise<readonly ExportedCodeBook[]> {
  const { results, codeBooks, dataSets } = database.stores;
  const found = await results.findMany(Object.values(report.pins));
  const ids = [...new Set(found.map(({ codeBookId }) => codeBookId))];
  const versions = await Promise.all(ids.map((id) => codeBooks.findById(id)));
  const names = new Map((await dataSets.list(studyId)).map(({ id, name }) => [id, name]));
  return versions
    .filter((version) => version !== null)
    .map(({ dataSetId, number, content }) => {
      return { dataSetName: names.get(dataSetId) ?? '', number, codeBook: content };
    })
    .toSorted(byNameAndNumber);
}

function byNameAndNumber(one: ExportedCodeBook, other: ExportedCodeBook): number {
  return one.dataSetName === other.dataSetName
    ? one.number - other.number
    : one.dataSetName < other.dataSetName
      ? -1
      : 1;
}
