import { computed, inject, Injectable } from '@angular/core';
import { addressKey, listValues } from '#shared/analysis';
import { PHRASEBOOK } from '../../ui/phrasebook';
import { ProofWords } from '../proof/proof-words';
import { type PrintedBlock, ReportProof } from '../proof/report-proof';
import { ReportState } from '../report-store/report-state';
import { ReportStore } from '../report-store/report-store';
import { blockChecks } from './block-checks';
import { guardChecks } from './guard-checks';
import type { ProofCheck } from './proof-check';
import type { PrintedValue } from './typed-numbers';

interface RememberedChecks {
  readonly values: readonly PrintedValue[] | null;
  readonly checks: readonly ProofCheck[];
}

/** What the rules find in the report as it prints now, in the order of its blocks. */
@Injectable()
export class ReportChecks {
  private readonly store = inject(ReportStore);
  private readonly state = inject(ReportState);
  private readonly proof = inject(ReportProof);
  private readonly words = inject(ProofWords);
  private readonly phrasebook = inject(PHRASEBOOK);
  private readonly remembered = new WeakMap<PrintedBlock, RememberedChecks>();

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

  /** A block that prints what it printed before has the checks that it had before. */
  private checksOf(blockId: string, printed: PrintedBlock): readonly ProofCheck[] {
    const known = this.remembered.get(printed);
    if (known !== undefined && (known.values === null || known.values === this.values())) {
      return known.checks;
    }
    const asked: { values: readonly PrintedValue[] | null } = { values: null };
    const values = (): readonly PrintedValue[] => (asked.values = this.values());
    const checks = blockChecks(blockId, printed, { nameOf: (id) => this.nameOf(id), values });
    this.remembered.set(printed, { values: asked.values, checks });
    return checks;
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
      return pin === undefined ? [] : guardChecks(blockId, printed, pin, under);
    });
  }

  /** Every value of the pinned analyses as it prints; worked out once a number was typed. */
  private readonly values = computed((): readonly PrintedValue[] => {
    const places = this.printedPlaces();
    return [...this.state.pins().values()].flatMap(({ analysisId, result }) =>
      listValues(result, analysisId).map(({ address }) => ({
        address,
        text: this.words.textOf(address),
        printedIn: places.get(addressKey(address)) ?? null,
      })),
    );
  });

  private printedPlaces(): ReadonlyMap<string, string> {
    const names = new Map(this.words.references().map((each) => [each.blockId, each.name]));
    const printed = [...this.proof.blocks()].flatMap(([blockId, { bound }]) => {
      const name = names.get(blockId);
      return name === undefined
        ? []
        : bound.map(({ address }) => [addressKey(address), name] as const);
    });
    return new Map(printed.toReversed());
  }

  private nameOf(analysisId: string): string {
    return this.state.pins().get(analysisId)?.number ?? 'Its analysis';
  }
}
