/**
 * A file name made from a title: one line, without what file systems or shells take amiss, short
 * enough everywhere. A title of which nothing is left gives "report".
 */
export function exportFileName(title: string, extension: string): string {
  const base = title
    .normalize('NFC')
    .replace(/[\p{C}\p{Zl}\p{Zp}]/gu, ' ')
    .replace(/[<>:"/\\|?*%]/g, ' ')
    .replace(/\s+/g, ' ')
    .replace(/^[.\s-]+/, '');
  const short = Array.from(base)
    .slice(0, LONGEST)
    .join('')
    .replace(/[.\s]+$/, '');
  return `${named(short)}.${extension}`;
}

const LONGEST = 80;

/** Names that one operating system keeps for devices. */
const DEVICES = /^(con|prn|aux|nul|com\d|lpt\d)$/i;

function named(base: string): string {
  if (base === '') return 'report';
  return DEVICES.test(base) ? `${base} report` : base;
}
