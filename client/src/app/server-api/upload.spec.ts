import { HttpEventType, provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { expect, it } from 'vitest';
import { DataApi } from './data-api';
import type { UploadEvent } from './upload-event';

const OPTIONS = { delimiter: null, encoding: null, decimalMark: null, sheet: null };

it('sends file and options as a form, and tells how much was sent', () => {
  TestBed.configureTestingModule({
    providers: [provideHttpClient(), provideHttpClientTesting()],
  });
  const file = new File(['a,b\n1,2\n'], 'counts.csv');
  const told: UploadEvent<unknown>[] = [];
  TestBed.inject(DataApi)
    .upload('s 1', { file, options: OPTIONS, dataSetId: 'd1' })
    .subscribe((event) => told.push(event));

  const sent = TestBed.inject(HttpTestingController).expectOne('/api/studies/s%201/uploads');
  const form = sent.request.body as FormData;
  expect([form.get('options'), form.get('dataSetId')]).toEqual([JSON.stringify(OPTIONS), 'd1']);
  expect((form.get('file') as File).name).toBe('counts.csv');

  sent.event({ type: HttpEventType.UploadProgress, loaded: 4, total: 8 });
  sent.flush({ id: 'u1' });
  expect(told).toEqual([
    { kind: 'sending', share: 0.5 },
    { kind: 'answered', answer: { id: 'u1' } },
  ]);
});
