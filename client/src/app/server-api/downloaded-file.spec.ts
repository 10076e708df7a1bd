import { HttpHeaders, HttpResponse } from '@angular/common/http';
import { expect, it } from 'vitest';
import { downloadedFile } from './downloaded-file';

function nameFrom(disposition: string | null): string {
  const headers = new HttpHeaders(
    disposition === null ? {} : { 'Content-Disposition': disposition },
  );
  return downloadedFile(new HttpResponse({ body: new Blob(), headers }), 'report.docx').name;
}

it('prefers the name that may hold any letter', () => {
  expect(nameFrom(`attachment; filename="Eczema.docx"; filename*=UTF-8''Ekzem%C3%A4.docx`)).toBe(
    'Ekzemä.docx',
  );
});

it('takes the plain name', () => {
  expect(nameFrom('attachment; filename="Twelve months.docx"')).toBe('Twelve months.docx');
});

it('has a name of its own when the server gives none, or a broken one', () => {
  expect(nameFrom(null)).toBe('report.docx');
  expect(nameFrom(`attachment; filename*=UTF-8''%E0%A4%A`)).toBe('report.docx');
});
