import { failure, success, type Result } from '#shared/core';
import type { IntakeIssue } from './intake-issue';

/** What a file is read as. */
export type FileType = 'delimited' | 'workbook';

const TYPE_OF_EXTENSION: ReadonlyMap<string, FileType> = new Map([
  ['csv', 'delimited'],
  ['tsv', 'delimited'],
  ['tab', 'delimited'],
  ['txt', 'delimited'],
  ['dat', 'delimited'],
  ['xlsx', 'workbook'],
  ['xlsm', 'workbook'],
]);

const ZIP_ARCHIVE = 'a workbook or another ZIP archive';
const OLD_OFFICE = 'an old or protected Office document';

/** First bytes by which formats are known. */
const SIGNATURES: readonly { readonly bytes: readonly number[]; readonly name: string }[] = [
  { bytes: [0x50, 0x4b, 0x03, 0x04], name: ZIP_ARCHIVE },
  { bytes: [0x50, 0x4b, 0x05, 0x06], name: 'an empty ZIP archive' },
  { bytes: [0xd0, 0xcf, 0x11, 0xe0], name: OLD_OFFICE },
  { bytes: [0x25, 0x50, 0x44, 0x46], name: 'a PDF document' },
  { bytes: [0x1f, 0x8b], name: 'a gzip archive' },
  { bytes: [0x89, 0x50, 0x4e, 0x47], name: 'a PNG picture' },
  { bytes: [0xff, 0xd8, 0xff], name: 'a JPEG picture' },
  { bytes: [0x37, 0x7a, 0xbc, 0xaf], name: 'a 7z archive' },
  { bytes: [0x52, 0x61, 0x72, 0x21], name: 'a RAR archive' },
  { bytes: [0x7b, 0x5c, 0x72, 0x74, 0x66], name: 'an RTF document' },
];

/** Decides how to read a file by its name, and checks that its first bytes agree. */
export function fileTypeOf(
  fileName: string,
  firstBytes: Uint8Array,
): Result<FileType, IntakeIssue> {
  const extension = /\.([^.\\/]*)$/.exec(fileName)?.[1]?.toLowerCase() ?? '';
  const type = TYPE_OF_EXTENSION.get(extension);
  if (type === undefined) return failure({ code: 'unknownType', facts: { extension } });
  if (firstBytes.length === 0) return failure({ code: 'emptyFile' });
  const signature = SIGNATURES.find(({ bytes }) =>
    bytes.every((byte, at) => firstBytes[at] === byte),
  );
  return type === 'workbook'
    ? checkWorkbook(extension, signature?.name)
    : checkText(extension, signature?.name);
}

function checkWorkbook(
  extension: string,
  found: string | undefined,
): Result<FileType, IntakeIssue> {
  if (found === ZIP_ARCHIVE) return success('workbook');
  if (found === OLD_OFFICE) return failure({ code: 'oldOrProtectedWorkbook' });
  return failure(notItsType(extension, found ?? 'no workbook'));
}

function checkText(extension: string, found: string | undefined): Result<FileType, IntakeIssue> {
  return found === undefined ? success('delimited') : failure(notItsType(extension, found));
}

function notItsType(extension: string, found: string): IntakeIssue {
  return { code: 'notItsType', facts: { expected: extension.toUpperCase(), found } };
}
