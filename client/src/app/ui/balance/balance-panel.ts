import { ChangeDetectionStrategy, Component, computed, input, model } from '@angular/core';
import type { Balance } from '#shared/wording';
import type { Framing } from '#shared/wording/phrase';
import { FramingGlyph } from '../framing/framing-glyph';
import { BalanceGaugeView } from './balance-gauge';

let made = 0;

/**
 * Both sizes of an effect with the gauge below. What the sentence says is marked and can be chosen
 * here; what it does not say stays in sight. A side that the design does not give says why.
 */
@Component({
  selector: 'eh-balance-panel',
  imports: [BalanceGaugeView, FramingGlyph],
  templateUrl: './balance-panel.html',
  styleUrl: './balance-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BalancePanel {
  readonly balance = input.required<Balance>();
  readonly framing = model.required<Framing>();
  /** Whether this person may choose the framing here. */
  readonly disabled = input(false);
  /** Whether the keys A, B and R act here; their caps are then drawn. */
  readonly showsKeys = input(true);

  protected readonly group = `balance-${++made}`;
  protected readonly bothAvailable = computed(
    () => this.balance().absolute.available && this.balance().relative.available,
  );
  protected readonly saysAbsolute = computed(
    () => this.balance().absolute.available && this.framing() !== 'relative',
  );
  protected readonly saysRelative = computed(
    () => this.balance().relative.available && this.framing() !== 'absolute',
  );
}
