import type { HttpResponse } from '@angular/common/http';

/** A file that the server made. */
export interface DownloadedFile {
  readonly name: string;
  readonly content: Blob;
}

/** Reads the file and the name that the server gave it; `fallbackName` serves when it gave none. */
export function downloadedFile(response: HttpResponse<Blob>, fallbackName: string): DownloadedFile {
  const disposition = response.headers.get('Content-Disposition') ?? '';
  return {
    name: extendedName(disposition) ?? plainName(disposition) ?? fallbackName,
    content: response.body ?? new Blob(),
  };
}

/** Hands a file to the browser, which saves it where the person keeps downloads. */
export function saveFile(file: DownloadedFile, document: Document): void {
  const url = URL.createObjectURL(file.content);
  const link = document.createElement('a');
  link.href = url;
  link.download = file.name;
  link.click();
  setTimeout(() => {
    URL.revokeObjectURL(url);
  }, 10_000);
}

/** The `filename*` parameter (RFC 6266, RFC 8187), always UTF-8. */
function extendedName(disposition: string): string | null {
  const encoded = /filename\*=UTF-8''([^;]+)/i.exec(disposition)?.[1];
  if (encoded === undefined) return null;
  try {
    return decodeURIComponent(encoded);
  } catch {
    return null;
  }
}

function plainName(disposition: string): string | null {
  return /filename="([^"]+)"/i.exec(disposition)?.[1] ?? null;
}
