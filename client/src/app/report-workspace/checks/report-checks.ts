import { computed, inject, Injectable } from '@angular/core';
import { pinValues } from '#shared/report';
import { PHRASEBOOK } from '../../ui/phrasebook';
import { ProofWords } from '../proof/proof-words';
import type { PrintedBlock } from '../proof/printed-block';
import { ReportProof } from '../proof/report-proof';
import { ReportState } from '../report-store/report-state';
import { ReportStore } from '../report-store/report-store';
import { blockChecks } from './block-checks';
import { guardChecks } from './guard-checks';
import { outsideChecks } from './outside-checks';
import type { ProofCheck } from './proof-check';
import { printedValue, type PrintedValue } from './typed-numbers';

/** What the rules find in the report as it prints now, in the order of its blocks. */
@Injectable()
export class ReportChecks {
  private readonly store = inject(ReportStore);
  private readonly state = inject(ReportState);
  private readonly proof = inject(ReportProof);
  private readonly words = inject(ProofWords);
  private readonly phrasebook = inject(PHRASEBOOK);

  readonly byBlock = computed(() => {
    const blocks = this.proof.blocks();
    const seen = new Set<string>();
    return new Map(
      this.store.blocks().map(({ id }) => {
        const printed = blocks.get(id);
        if (printed === undefined) return [id, []] as const;
        return [id, [...this.checksOf(id, printed), ...this.guardsOf(id, printed, seen)]] as const;
      }),
    );
  });

  readonly all = computed(() => [...this.byBlock().values()].flat());
  readonly open = computed(() => this.all().filter(({ weight }) => weight !== 'quiet'));
  readonly problems = computed(() => this.all().filter(({ weight }) => weight === 'problem'));
  readonly cautions = computed(() => this.all().filter(({ weight }) => weight === 'caution'));

  of(blockId: string): readonly ProofCheck[] {
    return this.byBlock().get(blockId) ?? [];
  }

  private checksOf(blockId: string, printed: PrintedBlock): readonly ProofCheck[] {
    return blockChecks(blockId, printed, {
      nameOf: (id) => this.nameOf(id),
      values: () => this.values(),
      placeOf: (key) => this.names().get(this.proof.captionedPlaces().get(key) ?? '') ?? null,
    });
  }

  /** `seen` holds what guards have said beside earlier blocks; this adds to it. */
  private guardsOf(
    blockId: string,
    printed: PrintedBlock,
    seen: Set<string>,
  ): readonly ProofCheck[] {
    const houseStyle = this.state.houseStyle();
    if (houseStyle === null) return [];
    const under = { houseStyle, phrasebook: this.phrasebook, seen };
    const shown = new Set(printed.bound.map(({ address }) => address.analysisId));
    return [...shown].flatMap((analysisId) => {
      const pin = this.state.pins().get(analysisId);
      if (pin === undefined) return [];
      return [
        ...guardChecks(blockId, printed, pin, under),
        ...outsideChecks(blockId, printed, pin, under),
      ];
    });
  }

  /** Every value of the pinned analyses as it prints; worked out once a number was typed. */
  private readonly values = computed((): readonly PrintedValue[] =>
    [...this.state.pins().values()].flatMap((pin) =>
      pinValues(pin).map(({ address }) => printedValue(address, this.words.textOf(address))),
    ),
  );

  private readonly names = computed(
    () => new Map(this.words.references().map(({ blockId, name }) => [blockId, name])),
  );

  private nameOf(analysisId: string): string {
    return this.state.pins().get(analysisId)?.number ?? 'Its analysis';
  }
}
