import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import type { Framing } from '#shared/wording/phrase';
import {
  availableFramings,
  claimOf,
  methodsNoteOf,
  phraseOfClaim,
  phraseText,
} from '#shared/wording';
import { FramingRail } from '../../ui/framing/framing-rail';
import { BenchStore } from '../bench/bench-store';

/** What a report will say of the contrast in view, under each framing, and how it was done. */
@Component({
  selector: 'eh-say-panel',
  imports: [FramingRail],
  template: `
    <h2>{{ name() }} will say</h2>
    @if (sentence(); as sentence) {
      <p class="print" aria-live="polite">
        @for (part of sentence.parts; track $index) {
          @if (part.kind === 'text') {
            <span>{{ part.text }}</span>
          } @else {
            <b>{{ part.text }}</b>
          }
        }
      </p>
      @if (hasChoice()) {
        <eh-framing-rail compact [(framing)]="framing" name="What leads the sentence" />
      } @else {
        <p class="second">Only odds ratios can be said here.</p>
      }
      <details>
        <summary>Methods note</summary>
        <p class="print small">{{ methods() }}</p>
      </details>
    }
  `,
  styleUrl: './say-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SayPanel {
  private readonly store = inject(BenchStore);

  protected readonly framing = signal<Framing>('both');
  protected readonly name = computed(() => this.store.saved()?.number ?? 'This analysis');
  private readonly claim = computed(() => {
    const [print, indexLevelId] = [this.store.print(), this.store.levelId()];
    if (print === null || indexLevelId === null) return null;
    const analysisId = this.store.saved()?.id ?? 'draft';
    const claim = claimOf(print.result, { analysisId, indexLevelId, scope: this.store.scope() });
    return claim.ok ? claim.value : null;
  });
  protected readonly sentence = computed(() => {
    const [print, claim] = [this.store.print(), this.claim()];
    if (print === null || claim === null) return null;
    return phraseOfClaim(claim, this.framing(), print.style, print.book);
  });
  protected readonly hasChoice = computed(() => {
    const claim = this.claim();
    return claim !== null && availableFramings(claim).length > 1;
  });
  protected readonly methods = computed(() => {
    const print = this.store.print();
    if (print === null) return '';
    return methodsNoteOf({ analysisId: '', result: print.result }, print.style, print.book)
      .map(phraseText)
      .join(' ');
  });
}
