import { InjectionToken } from '@angular/core';

/** The present moment. Specs put their own in its place. */
export const NOW = new InjectionToken<() => Date>('NOW', {
  providedIn: 'root',
  factory: () => () => new Date(),
});
