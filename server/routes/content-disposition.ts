/**
 * The header that names a download; any characters are data only.
 *
 * A plain ASCII name for old readers, the true one percent-encoded beside it. Source: RFC 6266.
 */
export function contentDisposition(fileName: string): string {
  const plain = fileName.normalize('NFKD').replace(/[^\w.() -]/g, '_');
  const encoded = encodeURIComponent(fileName.replace(/\p{Surrogate}/gu, '_')).replace(
    /['()*]/g,
    (character) => `%${character.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `attachment; filename="${plain}"; filename*=UTF-8''${encoded}`;
}
