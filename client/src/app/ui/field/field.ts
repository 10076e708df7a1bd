import {
  ChangeDetectionStrategy,
  Component,
  computed,
  contentChild,
  effect,
  input,
} from '@angular/core';
import { Icon } from '../marks/icon';
import { FieldControl } from './field-control';

let made = 0;

/**
 * A control with its label above and, below, its help and what is wrong with it.
 *
 * ```html
 * <eh-field label="Report name" [problem]="problems.of('title')">
 *   <input ehControl class="input" formControlName="title" />
 * </eh-field>
 * ```
 */
@Component({
  selector: 'eh-field',
  imports: [Icon],
  templateUrl: './field.html',
  styleUrl: './field.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Field {
  readonly label = input.required<string>();
  readonly help = input('');
  /** What is wrong and what to do, in one or two sentences; null or empty when nothing is. */
  readonly problem = input<string | null>(null);
  readonly optional = input(false);

  protected readonly id = `field-${++made}`;
  private readonly control = contentChild.required(FieldControl);
  private readonly describedBy = computed(() => {
    const parts = [
      this.help() === '' ? '' : `${this.id}-help`,
      this.problem() ? `${this.id}-problem` : '',
    ];
    return parts.filter((part) => part !== '').join(' ');
  });

  constructor() {
    effect(() => {
      this.control().link({
        id: this.id,
        describedBy: this.describedBy(),
        invalid: Boolean(this.problem()),
      });
    });
  }
}
