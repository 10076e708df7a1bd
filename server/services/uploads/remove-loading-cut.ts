import type { Dependencies } from '../../dependencies';

/** Pieces that one removal takes; what is left follows, so that others are never kept waiting. */
const PIECES_AT_A_TIME = 32;

/** Removes a cut that was not finished, piece by piece; nothing happens to a ready one. */
export async function removeLoadingCut({ database }: Dependencies, cutId: string): Promise<void> {
  const { cuts, columnChunks } = database.stores;
  const cut = await cuts.findById(cutId);
  if (cut?.state !== 'loading') return;
  let left = 1;
  while (left > 0) {
    left = await database.unitOfWork('site', (unit) =>
      columnChunks.removeSome(cutId, PIECES_AT_A_TIME, unit),
    );
  }
  await database.unitOfWork('site', (unit) => cuts.removeLoading(cutId, unit));
}
