import { InjectionToken } from '@angular/core';
import { parsePhrasebook, type Phrasebook } from '#shared/wording';
import english from '../../../../templates/phrasebooks/en.json';

/** The words of generated sentences and reasons, from the same file that the server reads. */
export const PHRASEBOOK = new InjectionToken<Phrasebook>('PHRASEBOOK', {
  providedIn: 'root',
  factory: () => {
    const book = parsePhrasebook(english);
    if (!book.ok) throw new Error(`The phrasebook is broken: ${JSON.stringify(book.issue)}`);
    return book.value;
  },
});
