import { ChangeDetectionStrategy, Component } from '@angular/core';
import { multipleMarks, peopleMarks, placeOf, SHOWN_EFFECT } from './effect-scale';

/** One effect drawn once and read on two edges, in the colours of the spine. */
@Component({
  selector: 'eh-effect-art',
  templateUrl: './effect-art.html',
  styleUrl: './effect-art.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EffectArt {
  protected readonly people = peopleMarks();
  protected readonly multiples = multipleMarks();
  protected readonly reference = placeOf(SHOWN_EFFECT.reference);
  protected readonly exposed = placeOf(SHOWN_EFFECT.exposed);
}
