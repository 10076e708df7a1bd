import type { CutSummary, DataSetView } from '#shared/api';

/** A cut with the data set that it belongs to. */
export interface CutPlace {
  readonly cut: CutSummary;
  readonly dataSet: DataSetView;
}

/** Finds a cut among data sets. */
export function cutPlaceOf(
  dataSets: readonly DataSetView[],
  cutId: string | null,
): CutPlace | null {
  for (const dataSet of dataSets) {
    const cut = dataSet.cuts.find(({ id }) => id === cutId);
    if (cut !== undefined) return { cut, dataSet };
  }
  return null;
}

/** The newest cut of the first data set that has one, to start an analysis with. */
export function newestCut(dataSets: readonly DataSetView[]): CutPlace | null {
  const places = dataSets.flatMap((dataSet) => dataSet.cuts.map((cut) => ({ cut, dataSet })));
  const sorted = places.toSorted((one, other) => compare(other.cut.createdAt, one.cut.createdAt));
  return sorted[0] ?? null;
}

function compare(one: string, other: string): number {
  return one < other ? -1 : Number(one > other);
}
