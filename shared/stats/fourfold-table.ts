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
  /** Members of the stratum in the whole analysis, where it has more groups than these two. */
  readonly members?: number;
  /** The stratum's share in a chosen standard population, or its members there. */
  readonly share?: number;
}

/** One contrast, layer by layer of the stratifying factor. */
export type StratifiedTable = readonly TableStratum[];
