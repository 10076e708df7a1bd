import { strFromU8, unzipSync } from 'fflate';
import { EXPORT_FORMATS, type ExportFormatId } from '../../server/exports/export-format';
import type { ExportRequest } from '../../server/exports/export-request';
import { parseXml, type XmlElement } from '../builders/xml-tree';

/** Makes a file. */
export async function exported(
  formatId: ExportFormatId,
  request: ExportRequest,
): Promise<Uint8Array> {
  const render = await EXPORT_FORMATS[formatId].load();
  return render(request);
}

/** The text of a part of a file; a part that is not there is an error. */
export function partText(file: Uint8Array, path: string): string {
  const part = unzipSync(file)[path];
  if (part === undefined) throw new Error(`The file has no part ${path}.`);
  return strFromU8(part);
}

/** A part of a file as a tree. */
export function partTree(file: Uint8Array, path: string): XmlElement {
  return parseXml(partText(file, path));
}

/** XML with an element a line, for files that people read. */
export function inLines(xml: string): string {
  return xml.replace(/></g, '>\n<') + '\n';
}
