import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { Run, RunMark } from '#shared/layout';
import { ValueChip } from './value-chip';

type RunShape = 'chip' | 'reference' | 'link' | 'superscript' | 'subscript' | 'text';

/** A run as it is drawn: the element that it becomes, and its styles by class. */
interface DrawnRun {
  readonly run: Run;
  readonly shape: RunShape;
  readonly classes: string;
}

/** Runs of styled text: chips for values, references, links, plain words. */
@Component({
  selector: 'eh-proof-runs',
  imports: [ValueChip],
  templateUrl: './proof-runs.html',
  styleUrl: './proof-runs.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProofRuns {
  readonly runs = input.required<readonly Run[]>();
  /** Whether values are chips that take the focus; a table has too many of them for that. */
  readonly values = input<'chips' | 'plain'>('chips');
  /** The block id of the table or figure whose reference was followed. */
  readonly referenceFollowed = output<string>();

  protected readonly drawn = computed(() => {
    const values = this.values();
    return this.runs().map((run): DrawnRun => {
      return { run, shape: shapeOf(run, values), classes: (run.marks ?? []).join(' ') };
    });
  });
}

function shapeOf(run: Run, values: 'chips' | 'plain'): RunShape {
  if (isValue(run) && values === 'chips') return 'chip';
  if (run.reference !== undefined) return 'reference';
  if (run.link !== undefined) return 'link';
  return scriptOf(run.marks ?? []);
}

function isValue(run: Run): boolean {
  return run.origin !== undefined && run.origin.state !== 'text';
}

function scriptOf(marks: readonly RunMark[]): RunShape {
  if (marks.includes('superscript')) return 'superscript';
  return marks.includes('subscript') ? 'subscript' : 'text';
}
