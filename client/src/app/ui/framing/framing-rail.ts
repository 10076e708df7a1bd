import {
  booleanAttribute,
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  model,
} from '@angular/core';
import { FRAMINGS, type Framing } from '#shared/wording/phrase';
import { FramingGlyph } from './framing-glyph';

/** The words of the framings. */
export const FRAMING_WORDS: Readonly<Record<Framing, string>> = {
  absolute: 'Absolute',
  both: 'Both',
  relative: 'Relative',
};

let made = 0;

/** Three words over a graduated line; a thumb slides beneath the chosen one. */
@Component({
  selector: 'eh-framing-rail',
  imports: [FramingGlyph],
  template: `
    <fieldset [style.--at]="place()" [disabled]="disabled()">
      <legend class="sr">{{ name() }}</legend>
      @for (each of framings; track each) {
        <label [class.chosen]="framing() === each">
          <input
            type="radio"
            [name]="group"
            [value]="each"
            [checked]="framing() === each"
            (change)="framing.set(each)"
          />
          @if (!compact()) {
            <eh-framing-glyph [framing]="each" />
          }
          {{ words[each] }}
        </label>
      }
    </fieldset>
  `,
  styleUrl: './framing-rail.scss',
  host: { '[class.compact]': 'compact()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FramingRail {
  readonly framing = model.required<Framing>();
  readonly name = input('The report says');
  readonly disabled = input(false);
  /** Whether only the words are shown, for narrow places. */
  readonly compact = input(false, { transform: booleanAttribute });

  protected readonly framings = FRAMINGS;
  protected readonly words = FRAMING_WORDS;
  protected readonly group = `framing-rail-${++made}`;
  protected readonly place = computed(() => FRAMINGS.indexOf(this.framing()));
}
