import { computed, inject, Injectable } from '@angular/core';
import type { LayoutElement } from '#shared/layout';
import { createComposer, type PrintedNumber, valueLedger } from '#shared/report';
import { PHRASEBOOK } from '../../ui/phrasebook';
import { ReportState } from '../report-store/report-state';

/** What a block prints, and its numbers. */
export interface PrintedBlock {
  readonly elements: readonly LayoutElement[];
  /** Numbers with a source, in the order of print. */
  readonly bound: readonly PrintedNumber[];
}

const NOTHING: PrintedBlock = { elements: [], bound: [] };

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

  readonly composed = computed(() => {
    const report = this.state.report();
    const houseStyle = this.state.houseStyle();
    if (report === null || houseStyle === null) return null;
    const pins = this.state.pins();
    const shown = Object.fromEntries([...pins].map(([id, pin]) => [id, pin.resultId]));
    return this.composer.compose({
      report: { ...report, pins: shown },
      pins: pins.values(),
      houseStyle,
      phrasebook: this.phrasebook,
    });
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

  /** How many numbers the report prints that have a source. */
  readonly boundCount = computed(() =>
    [...this.blocks().values()].reduce((sum, { bound }) => sum + bound.length, 0),
  );

  of(blockId: string): PrintedBlock {
    return this.blocks().get(blockId) ?? NOTHING;
  }

  private remembering(
    blocks: ReadonlyMap<string, readonly LayoutElement[]>,
  ): ReadonlyMap<string, PrintedBlock> {
    const now = new Map<string, PrintedBlock>();
    for (const [blockId, elements] of blocks) {
      const known = this.before.get(blockId);
      now.set(blockId, known && sameElements(known.elements, elements) ? known : printed(elements));
    }
    this.before = now;
    return now;
  }
}

function sameElements(one: readonly LayoutElement[], other: readonly LayoutElement[]): boolean {
  return one.length === other.length && one.every((element, index) => element === other[index]);
}

function printed(elements: readonly LayoutElement[]): PrintedBlock {
  return { elements, bound: valueLedger({ title: '', elements, abbreviations: [] }) };
}
