/** What one file may hold; beyond it, reading ends with a clear message. */
export const LIMITS = {
  /** Bytes of one stored piece of a column. */
  chunkBytes: 262_144,
  columns: 2000,
  /** Bytes of one cell. A stored piece of a dictionary holds at least one value. */
  cellBytes: 65_536,
  /** Bytes of one row; a quotation mark that is never closed runs into this. */
  rowBytes: 16 * 1024 * 1024,
  /** Bytes of the distinct values of all columns together. */
  dictionaryBytes: 512 * 1024 * 1024,
  /** Characters of a column's name. */
  nameCharacters: 900,
  /** Bytes that a workbook may unpack to. */
  unpackedBytes: 2 * 1024 * 1024 * 1024,
  /** How many times its own size a workbook may unpack to, once it is over the size below. */
  unpackedRatio: 100,
  unpackedFreeBytes: 16 * 1024 * 1024,
  /** Bytes of the texts that cells of a workbook share. */
  sharedTextBytes: 256 * 1024 * 1024,
} as const;
