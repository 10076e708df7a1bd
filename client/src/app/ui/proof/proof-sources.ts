import { InjectionToken, signal, type WritableSignal } from '@angular/core';
import type { ValueAddress } from '#shared/analysis';
import type { RunOrigin } from '#shared/layout';

/** What a page that shows a proof knows about the sources of its numbers. */
export interface ProofSources {
  /** What an analysis is called in print and in chips, as in "A2"; null when it is not known. */
  readonly nameOf: (analysisId: string) => string | null;
  /** The run under the pointer or the focus; chips set it, the margin lights its source. */
  readonly spotlight: WritableSignal<RunOrigin | null>;
  /** Whether an address is lit from outside, as when its source has the focus. */
  readonly isLit: (address: ValueAddress) => boolean;
}

/**
 * Ties the numbers of a proof to their sources. A page provides its own; without one, chips are
 * drawn and read aloud without the name of their analysis.
 */
export const PROOF_SOURCES = new InjectionToken<ProofSources>('PROOF_SOURCES', {
  providedIn: 'root',
  factory: () => ({
    nameOf: () => null,
    spotlight: signal<RunOrigin | null>(null),
    isLit: () => false,
  }),
});
