/** Events among the members of one group; `0 <= events <= total`, both whole numbers. */
export interface GroupCount {
  readonly events: number;
  readonly total: number;
}

/** Counts of two independent groups; effects are always index against reference. */
export interface FourfoldTable {
  readonly index: GroupCount;
  readonly reference: GroupCount;
}

/** The fourfold table of one stratum. */
export interface TableStratum {
  readonly id: string;
  readonly table: FourfoldTable;
}

/** One contrast, layer by layer of the stratifying factor. */
export type StratifiedTable = readonly TableStratum[];
