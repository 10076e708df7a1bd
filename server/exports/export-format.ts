import type { ExportRequest } from './export-request';

/** A kind of file that a report can be saved as. */
export interface ExportFormat {
  /** What a person calls it, with its article. */
  readonly label: string;
  readonly extension: string;
  readonly contentType: string;
  /** Loads the renderer, which is heavy, where it is needed: in the worker. */
  readonly load: () => Promise<Renderer>;
}

/** Makes the bytes of a file; the same request gives the same bytes. */
export type Renderer = (request: ExportRequest) => Promise<Uint8Array>;

/** The register of formats: a format is its folder below `formats/` and its entry here. */
export const EXPORT_FORMATS = {
  docx: {
    label: 'a Word document',
    extension: 'docx',
    contentType: 'application/vnd.openxmlformats-officedocument.wordprocessingml.document',
    load: async () => (await import('./formats/docx/render-docx')).renderDocx,
  },
  xlsx: {
    label: 'an Excel workbook',
    extension: 'xlsx',
    contentType: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
    load: async () => (await import('./formats/xlsx/render-xlsx')).renderXlsx,
  },
} as const satisfies Readonly<Record<string, ExportFormat>>;

/** Id of a format. */
export type ExportFormatId = keyof typeof EXPORT_FORMATS;
