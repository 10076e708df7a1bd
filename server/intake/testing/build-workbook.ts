import ExcelJS from 'exceljs';
import { strToU8, zipSync, type Zippable } from 'fflate';

/** A workbook made by an independent library; `fill` gets its sheets ready. */
export async function buildWorkbook(fill: (workbook: ExcelJS.Workbook) => void): Promise<Buffer> {
  const workbook = new ExcelJS.Workbook();
  fill(workbook);
  return Buffer.from(await workbook.xlsx.writeBuffer());
}

const RELATION = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';

/** A workbook put together by hand from the XML of its one sheet, and from other parts. */
export function handmadeWorkbook(
  sheetXml: string,
  parts: Readonly<Record<string, string | Uint8Array>> = {},
): Buffer {
  const files: Record<string, string | Uint8Array> = {
    '_rels/.rels': relations([['r1', 'officeDocument', 'xl/workbook.xml']]),
    'xl/workbook.xml': `<workbook xmlns:r="${RELATION}"><sheets><sheet name="One" sheetId="1" r:id="r1"/></sheets></workbook>`,
    'xl/_rels/workbook.xml.rels': relations([
      ['r1', 'worksheet', 'worksheets/sheet1.xml'],
      ['r2', 'sharedStrings', '/xl/sharedStrings.xml'],
    ]),
    'xl/sharedStrings.xml': '<sst><si><t>a</t></si></sst>',
    'xl/worksheets/sheet1.xml': `<worksheet><sheetData>${sheetXml}</sheetData></worksheet>`,
    ...parts,
  };
  const zippable: Zippable = Object.fromEntries(
    Object.entries(files).map(([name, part]) => [
      name,
      typeof part === 'string' ? strToU8(part) : part,
    ]),
  );
  return Buffer.from(zipSync(zippable));
}

/** A part that lists what another part refers to. */
export function relations(
  listed: readonly (readonly [id: string, type: string, target: string])[],
): string {
  const elements = listed.map(
    ([id, type, target]) =>
      `<Relationship Id="${id}" Type="${RELATION}/${type}" Target="${target}"/>`,
  );
  return `<Relationships>${elements.join('')}</Relationships>`;
}
