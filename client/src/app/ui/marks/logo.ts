import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** The mark: an E; its stem is the zero line, its arms are two edges, its bar is one effect. */
@Component({
  selector: 'eh-logo',
  template: `
    <svg [attr.width]="size()" [attr.height]="size()" viewBox="0 0 40 40" aria-hidden="true">
      <path fill="currentColor" d="M5 5h30v3H8v24h27v3H5z" />
      <rect x="10.5" y="14.5" width="5.5" height="11" fill="currentColor" />
      <rect class="excess" x="16" y="14.5" width="14.5" height="11" />
    </svg>
  `,
  styles: `
    :host {
      display: inline-flex;
    }
    .excess {
      fill: var(--logo-excess, var(--verd));
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Logo {
  readonly size = input(34);
}
