import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { Framing } from '#shared/wording/phrase';

/** A bar between two edges; the edge that is read carries ticks. */
@Component({
  selector: 'eh-framing-glyph',
  template: `
    <svg viewBox="0 0 18 14" width="18" height="14" aria-hidden="true">
      <rect x="1" y="5.5" width="16" height="3" />
      @if (absolute()) {
        <path d="M1.6 4V.8M5.8 4V2M9 4V.8M12.8 4V2M16.4 4V.8" />
      }
      @if (relative()) {
        <path d="M1.6 10v3.2M6.5 10v3.2M11.5 10v3.2M16.4 10v3.2" />
      }
    </svg>
  `,
  styles: `
    :host {
      display: inline-flex;
      flex: none;
    }
    rect {
      fill: currentColor;
    }
    path {
      stroke: currentColor;
      stroke-width: 1.2;
      fill: none;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FramingGlyph {
  readonly framing = input.required<Framing>();
  protected readonly absolute = computed(() => this.framing() !== 'relative');
  protected readonly relative = computed(() => this.framing() !== 'absolute');
}
