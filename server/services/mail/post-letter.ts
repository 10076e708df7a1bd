import type { Dependencies } from '../../dependencies';
import type { LetterFacts, LetterName } from '../../mail/letters';
import type { Delivery } from '../../mail/mailer';
import { timestamp } from '../../runtime/clock';

const HIDDEN_LINK = '(a link that only the addressee may open)';

/**
 * Sends a letter and records it for administrators with its live link hidden.
 *
 * A mail that the SMTP server did not take is recorded as failed, and lies in the outbox.
 */
export async function postLetter<Name extends LetterName>(
  dependencies: Dependencies,
  to: string,
  name: Name,
  facts: LetterFacts<Name>,
): Promise<void> {
  const { ids, mailer, writeLetter } = dependencies;
  const id = ids.next();
  const delivery = await mailer.send({ id, to, ...writeLetter(name, facts) });
  const shown = writeLetter(name, 'link' in facts ? { ...facts, link: HIDDEN_LINK } : facts);
  await record(dependencies, { id, to, ...shown }, delivery);
}

async function record(
  { database, clock, log }: Dependencies,
  mail: {
    readonly id: string;
    readonly to: string;
    readonly subject: string;
    readonly text: string;
  },
  delivery: Delivery,
): Promise<void> {
  const { id, to, subject, text } = mail;
  const problem = delivery.kind === 'failed' ? delivery.problem : null;
  if (problem !== null) log(`The SMTP server did not take a mail (${id})`, problem);
  const sentAt = timestamp(clock);
  await database.unitOfWork('site', (unit) =>
    database.stores.mail.insert(
      { id, toAddress: to, subject, text, sentAt, delivery: delivery.kind, problem },
      unit,
    ),
  );
}
