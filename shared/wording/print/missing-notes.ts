import { formatCount } from '#shared/format';
import { fillPattern, fillWords } from '../phrasebook/fill-pattern';
import type { Phrase } from '../phrase';
import { printAddress, WHOLE, type PrintContext } from './print-context';

/** How many records are left out, and for which missing codes; nothing where none are. */
export function missingNotes(context: PrintContext): readonly Phrase[] {
  const { result, style, book } = context;
  const total = result.leftOut.reduce((sum, { count }) => sum + count, 0);
  if (total === 0) {
    return [];
  }
  const reasons = result.leftOut
    .filter(({ count }) => count > 0)
    .map(({ count, reason }) =>
      fillWords(book, 'note.missingReason', { count: formatCount(count, style).text, reason }),
    );
  const parts = fillPattern(book, total === 1 ? 'note.missingOne' : 'note.missing', {
    count: {
      kind: 'value',
      text: formatCount(total, style).text,
      address: printAddress(context, 'leftOut', WHOLE),
    },
    reasons: reasons.join(fillWords(book, 'list.semicolon', {})),
  });
  return [{ parts }];
}
