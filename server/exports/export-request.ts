import type { CodeBook } from '#shared/code-book';
import type { HouseStyle } from '#shared/house-style';
import type { ComposedReport } from '#shared/layout';
import type { PinnedAnalysis } from '#shared/report';
import type { Phrasebook } from '#shared/wording';

/** The code book that one or more of the pinned results were computed under. */
export interface ExportedCodeBook {
  readonly dataSetName: string;
  readonly number: number;
  readonly codeBook: CodeBook;
}

/**
 * Everything that a file is made from, as plain data: equal requests give equal bytes. `changedAt`
 * is the report's last change, the only date that a file tells.
 */
export interface ExportRequest {
  readonly report: ComposedReport;
  readonly houseStyle: HouseStyle;
  readonly phrasebook: Phrasebook;
  readonly pins: readonly PinnedAnalysis[];
  readonly codeBooks: readonly ExportedCodeBook[];
  readonly study: { readonly title: string; readonly invented: boolean };
  readonly changedAt: string;
  /** Where the fonts of figures are kept once they are unpacked. */
  readonly fontDirectory: string;
}
