import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { FACTOR_SOURCE } from '#shared/code-book';
import { COLUMN_KIND_WORDS, COUNT_LAYOUT_WORDS } from '../../ui/code-book-editor/column-words';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { ProblemPanel } from '../../ui/status/problem-panel';
import { NewCutStore } from './new-cut-store';

/** What the cut will hold, its name and date, before it is stored for good. */
@Component({
  selector: 'eh-check-step',
  imports: [Field, FieldControl, ProblemPanel],
  templateUrl: './check-step.html',
  styleUrl: './check-step.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CheckStep {
  protected readonly store = inject(NewCutStore);
  protected readonly layoutWords = computed(() => {
    const kind = this.store.codeBook()?.layout.kind;
    return kind === undefined ? '' : COUNT_LAYOUT_WORDS[kind].name;
  });
  protected readonly groups = computed(() => this.columnsByUse());
  protected readonly nameProblem = computed(() =>
    this.store.dataSetName().trim() === '' && this.store.dataSet() === null
      ? 'Give the data set a name.'
      : (this.store.problem()?.fieldMessage('dataSetName') ?? null),
  );
  protected readonly dateProblem = computed(() =>
    this.store.dataDate() === ''
      ? 'Give the date of the data.'
      : (this.store.problem()?.fieldMessage('dataDate') ?? null),
  );

  protected valueOf(event: Event): string {
    return (event.target as HTMLInputElement).value;
  }

  /** Columns that can be compared or split by, the other used ones, and those that are not used. */
  private columnsByUse(): readonly { readonly use: string; readonly names: readonly string[] }[] {
    const columns = this.store.codeBook()?.columns ?? [];
    const named = (pick: (column: (typeof columns)[number]) => boolean): string[] =>
      columns
        .filter(pick)
        .map(({ label, kind }) => `${label} (${COLUMN_KIND_WORDS[kind].toLowerCase()})`);
    return [
      { use: 'To compare or split by', names: named(({ kind }) => isFactor(kind)) },
      { use: 'Other', names: named(({ kind }) => !isFactor(kind) && kind !== 'ignored') },
      { use: 'Not used', names: named(({ kind }) => kind === 'ignored') },
    ].filter(({ names }) => names.length > 0);
  }
}

function isFactor(kind: keyof typeof FACTOR_SOURCE): boolean {
  return FACTOR_SOURCE[kind] !== null && kind !== 'count';
}
