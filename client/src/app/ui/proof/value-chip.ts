import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { RunOrigin } from '#shared/layout';
import { PROOF_SOURCES, type ProofSources } from './proof-sources';

/**
 * A number in the proof with its source: bound ones follow it, missing ones have lost it, typed
 * ones have none. Takes the focus in turn, and is read aloud with its source.
 */
@Component({
  selector: 'eh-value-chip',
  template: '<span aria-hidden="true" [textContent]="text()"></span>',
  styleUrl: './value-chip.scss',
  host: {
    tabindex: '0',
    role: 'img',
    '[class]': 'origin().state',
    '[class.lit]': 'lit()',
    '[attr.aria-label]': 'spoken()',
    '(focus)': 'show(origin())',
    '(blur)': 'show(null)',
    '(mouseenter)': 'show(origin())',
    '(mouseleave)': 'show(null)',
  },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ValueChip {
  private readonly sources = inject(PROOF_SOURCES);

  readonly text = input.required<string>();
  readonly origin = input.required<RunOrigin>();

  protected readonly spoken = computed(() => {
    const origin = this.origin();
    return `${this.text()}, ${SPOKEN[origin.state](origin, this.sources)}`;
  });
  protected readonly lit = computed(() =>
    this.origin().addresses.some((address) => this.sources.isLit(address)),
  );

  protected show(origin: RunOrigin | null): void {
    this.sources.spotlight.set(origin);
  }
}

type SpokenSource = (origin: RunOrigin, sources: ProofSources) => string;

const SPOKEN: Readonly<Record<RunOrigin['state'], SpokenSource>> = {
  text: () => 'from the analysis',
  bound: (origin, sources) => `bound to ${namesOf(origin, sources)}`,
  missing: () => 'its source is gone',
  typed: () => 'typed, not bound',
};

function namesOf(origin: RunOrigin, sources: ProofSources): string {
  const ids = [...new Set(origin.addresses.map((address) => address.analysisId))];
  return ids.map((id) => sources.nameOf(id) ?? 'its analysis').join(' and ');
}
