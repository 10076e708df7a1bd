import { computed, inject, Injectable } from '@angular/core';
import type { LayoutElement } from '#shared/layout';
import { type ComposeRequest, createComposer } from '#shared/report';
import { PHRASEBOOK } from '../../ui/phrasebook';
import { ReportState } from '../report-store/report-state';
import { NOTHING_PRINTED, type PrintedBlock, printedBlock } from './printed-block';

/**
 * The report as it prints, block by block. A block that prints the same as before is the same
 * object as before, so that only what has changed is drawn again.
 */
@Injectable()
export class ReportProof {
  private readonly state = inject(ReportState);
  private readonly phrasebook = inject(PHRASEBOOK);
  private readonly composer = createComposer();
  private before: ReadonlyMap<string, PrintedBlock> = new Map();

  /** What the composer is asked for; null until the report is open. */
  readonly request = computed((): ComposeRequest | null => {
    const report = this.state.report();
    const houseStyle = this.state.houseStyle();
    if (report === null || houseStyle === null) return null;
    const pins = this.state.pins();
    const shown = Object.fromEntries([...pins].map(([id, pin]) => [id, pin.resultId]));
    const { phrasebook } = this;
    return { report: { ...report, pins: shown }, pins: [...pins.values()], houseStyle, phrasebook };
  });
  readonly composed = computed(() => {
    const request = this.request();
    return request === null ? null : this.composer.compose(request);
  });

  readonly blocks = computed(() => {
    const blocks = new Map<string, LayoutElement[]>();
    for (const element of this.composed()?.elements ?? []) {
      const known = blocks.get(element.blockId);
      if (known === undefined) blocks.set(element.blockId, [element]);
      else known.push(element);
    }
    return this.remembering(blocks);
  });

  /** Which block prints a value in its table or figure, by the key of the value's address. */
  readonly captionedPlaces = computed((): ReadonlyMap<string, string> => {
    const places = new Map<string, string>();
    for (const [blockId, printed] of this.blocks()) {
      if (printed.caption === null) continue;
      for (const key of printed.figures.keys()) {
        if (!places.has(key)) places.set(key, blockId);
      }
    }
    return places;
  });

  of(blockId: string): PrintedBlock {
    return this.blocks().get(blockId) ?? NOTHING_PRINTED;
  }

  /** Composes a part of the report beforehand, so that it is at hand when it is asked for. */
  warm(request: ComposeRequest): void {
    this.composer.compose(request);
  }

  private remembering(
    blocks: ReadonlyMap<string, readonly LayoutElement[]>,
  ): ReadonlyMap<string, PrintedBlock> {
    const now = new Map<string, PrintedBlock>();
    for (const [blockId, elements] of blocks) {
      const known = this.before.get(blockId);
      const same = known !== undefined && sameElements(known.elements, elements);
      now.set(blockId, same ? known : printedBlock(elements));
    }
    this.before = now;
    return now;
  }
}

function sameElements(one: readonly LayoutElement[], other: readonly LayoutElement[]): boolean {
  return one.length === other.length && one.every((element, index) => element === other[index]);
}
