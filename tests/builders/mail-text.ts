/** The text of a plain mail: the quoted-printable body with its line breaks undone (RFC 2045). */
export function simpleText(mail: string): string {
  const body = mail.replaceAll('\r\n', '\n').split('\n\n').slice(1).join('\n\n');
  if (!/^Content-Transfer-Encoding: quoted-printable/im.test(mail)) return body;
  const bytes = body
    .replace(/=\n/g, '')
    .replace(/=([0-9A-F]{2})/g, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)));
  return Buffer.from(bytes, 'latin1').toString('utf8');
}
