import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { OutboxMail } from '#shared/api';
import { dateAndTime } from '../ui/dates';
import { EmptyState } from '../ui/status/empty-state';

const DELIVERY_WORDS: Readonly<Record<OutboxMail['delivery'], { text: string; tone: string }>> = {
  outbox: { text: 'Kept here', tone: '' },
  smtp: { text: 'Handed over', tone: 'clear' },
  failed: { text: 'Not accepted', tone: 'problem' },
};

/** Every mail with its text. Links that would let somebody in are hidden by the server. */
@Component({
  selector: 'eh-mail-outbox',
  imports: [EmptyState],
  templateUrl: './mail-outbox.html',
  styleUrl: './mail-outbox.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MailOutbox {
  readonly mail = input.required<readonly OutboxMail[]>();

  protected readonly delivery = DELIVERY_WORDS;
  protected readonly dateAndTime = dateAndTime;
}
