/**
 * Text as files can hold it: without control characters, halves of surrogate pairs and marks that
 * turn the direction of what follows. Line feeds stay; tabs and other line ends become blanks.
 */
export function printableText(text: string): string {
  return HARMLESS.test(text) ? text : cleaned(text);
}

/** Printable text on one line. */
export function printableLine(text: string): string {
  return printableText(text).replace(/\n/g, ' ');
}

/** What most texts are made of. */
const HARMLESS = /^[\u0020-\u007e\u00a0-\u1fff]*$/;

function cleaned(text: string): string {
  return text
    .replace(/\r\n?|[\u2028\u2029]/g, '\n')
    .replace(/\t/g, ' ')
    .replace(/[\p{Cc}\u202a-\u202e\ufffe\uffff]/gu, (control) => (control === '\n' ? '\n' : ''))
    .replace(/\p{Cs}/gu, '\ufffd');
}
