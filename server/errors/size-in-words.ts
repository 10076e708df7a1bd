/** A number of bytes for people, as in "512 MB"; whole units of 1024. */
export function sizeInWords(bytes: number): string {
  const mebibyte = 1024 * 1024;
  return bytes >= mebibyte
    ? `${String(Math.floor(bytes / mebibyte))} MB`
    : `${String(Math.max(1, Math.floor(bytes / 1024)))} kB`;
}
