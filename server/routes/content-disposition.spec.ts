import { describe, expect, it } from 'vitest';
import { contentDisposition } from './content-disposition';

describe('the name of a download', () => {
  it.each([
    ['report.docx', `attachment; filename="report.docx"; filename*=UTF-8''report.docx`],
    [
      'Hände (2).xlsx',
      `attachment; filename="Ha_nde (2).xlsx"; filename*=UTF-8''H%C3%A4nde%20%282%29.xlsx`,
    ],
    [
      'a"; b=\r\nX: 1',
      `attachment; filename="a__ b___X_ 1"; filename*=UTF-8''a%22%3B%20b%3D%0D%0AX%3A%201`,
    ],
    ['../../etc', `attachment; filename=".._.._etc"; filename*=UTF-8''..%2F..%2Fetc`],
    ['half \ud83d', `attachment; filename="half _"; filename*=UTF-8''half%20_`],
  ])('%j is data only', (name, header) => {
    expect(contentDisposition(name)).toBe(header);
  });
});
