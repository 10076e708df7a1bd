import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { BlockKindId } from '#shared/report';

type SketchPart = 'head' | 'lines' | 'table' | 'bars';

/** What each kind of block looks like from afar. */
const PARTS: Readonly<Record<BlockKindId, SketchPart>> = {
  heading: 'head',
  prose: 'lines',
  stratifiedTable: 'table',
  groupedBarChart: 'bars',
  effectSentence: 'lines',
};

const BAR_HEIGHTS = [
  { height: 7, ink: 'var(--lv1)' },
  { height: 10, ink: 'var(--lv2)' },
  { height: 15, ink: 'var(--lv3)' },
  { height: 23, ink: 'var(--lv4)' },
  { height: 31, ink: 'var(--lv5)' },
];

/** A report's page from afar: its blocks in their order, as far as they fit. */
@Component({
  selector: 'eh-report-sketch',
  templateUrl: './report-sketch.html',
  styleUrl: './report-sketch.scss',
  host: { 'aria-hidden': 'true' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReportSketch {
  readonly blockKinds = input.required<readonly string[]>();

  protected readonly bars = BAR_HEIGHTS;
  protected readonly parts = computed(() =>
    this.blockKinds()
      .filter(isKnown)
      .map((kind) => PARTS[kind]),
  );
}

function isKnown(kind: string): kind is BlockKindId {
  return Object.hasOwn(PARTS, kind);
}
