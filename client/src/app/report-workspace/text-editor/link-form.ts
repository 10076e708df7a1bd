import {
  ChangeDetectionStrategy,
  Component,
  type ElementRef,
  afterNextRender,
  input,
  output,
  signal,
  viewChild,
} from '@angular/core';
import { isAllowedLink } from '#shared/report/text/schema';

/** Asks where words lead to. */
@Component({
  selector: 'eh-link-form',
  template: `
    <form (submit)="set($event, address.value)">
      <input
        #address
        class="input"
        type="url"
        aria-label="Address of the link"
        placeholder="https://"
        [value]="href()"
        [attr.aria-invalid]="problem() !== ''"
        aria-describedby="link-problem"
        (keydown.escape)="leave($event)"
      />
      <button type="submit" class="button small">Set the link</button>
      @if (href() !== '') {
        <button type="button" class="button small" (click)="done.emit('')">Take it away</button>
      }
    </form>
    <p id="link-problem" role="alert">{{ problem() }}</p>
  `,
  styles: `
    form {
      display: flex;
      gap: 6px;
      padding: 4px;
      border-top: 1px solid var(--line);
    }
    .input {
      height: 28px;
      font-size: 13px;
    }
    p {
      padding: 0 6px;
      color: var(--verm);
      font: 500 12.5px/18px var(--sans);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LinkForm {
  readonly href = input.required<string>();
  /** The address; empty to take the link away, null to leave all as it is. */
  readonly done = output<string | null>();
  protected readonly problem = signal('');
  private readonly address = viewChild.required<ElementRef<HTMLInputElement>>('address');

  constructor() {
    afterNextRender(() => {
      this.address().nativeElement.select();
    });
  }

  protected set(event: Event, address: string): void {
    event.preventDefault();
    const href = address.trim();
    if (href === '' || isAllowedLink(href)) this.done.emit(href);
    else this.problem.set('A link begins with https://, http:// or mailto: and has no blanks.');
  }

  protected leave(event: Event): void {
    event.stopPropagation();
    this.done.emit(null);
  }
}
