import { type HttpEvent, HttpEventType } from '@angular/common/http';
import { EMPTY, type Observable, of } from 'rxjs';

/** What an upload tells while it runs: the share that was sent (0..1), then the answer. */
export type UploadEvent<Answer> =
  | { readonly kind: 'sending'; readonly share: number }
  | { readonly kind: 'answered'; readonly answer: Answer };

/** Reduces the browser's request events to those that a person cares about. */
export function uploadEvent<Answer>(event: HttpEvent<Answer>): Observable<UploadEvent<Answer>> {
  if (event.type === HttpEventType.UploadProgress) {
    const share = event.total === undefined ? 0 : event.loaded / event.total;
    return of({ kind: 'sending', share });
  }
  if (event.type === HttpEventType.Response && event.body !== null) {
    return of({ kind: 'answered', answer: event.body });
  }
  return EMPTY;
}
