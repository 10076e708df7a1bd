import { strFromU8, strToU8 } from 'fflate';
import { fixedZip, openZip } from '../../fixed-zip';

/**
 * Packs a workbook so that equal content gives equal bytes, and marks the cells whose words look
 * like a formula as words: without the mark they would become one as soon as somebody edits them.
 *
 * Source: ISO/IEC 29500-1, 18.8.45 (xf, quotePrefix).
 */
export function steadyWorkbook(bytes: Uint8Array): Uint8Array {
  const parts = openZip(bytes);
  const styles = parts[STYLES];
  if (styles === undefined) throw new Error(`The workbook has no part ${STYLES}.`);
  return fixedZip({ ...parts, [STYLES]: strToU8(withTextMarks(strFromU8(styles))) });
}

const STYLES = 'xl/styles.xml';

/** Number 49 is the format of words. */
function withTextMarks(styles: string): string {
  return styles.replace(/<xf numFmtId="49"/g, '$& quotePrefix="1"');
}
