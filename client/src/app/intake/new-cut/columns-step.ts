import { ChangeDetectionStrategy, Component, computed, inject, output } from '@angular/core';
import type { ColumnProfile } from '#shared/api';
import {
  changeKind,
  type CodeBookColumn,
  COLUMN_KINDS,
  type ColumnKind,
  COUNTED_OUTCOME_COLUMN_ID,
  replaceColumn,
} from '#shared/code-book';
import { COLUMN_KIND_WORDS, shownCode } from '../../ui/code-book-editor/column-words';
import { ScrollSideways } from '../../ui/scroll-sideways';
import { LayoutForm } from './layout-form';
import { NewCutStore } from './new-cut-store';
import { GroupedNumberPipe } from '../../ui/grouped-number-pipe';

interface ColumnRow {
  readonly column: CodeBookColumn;
  readonly contents: ColumnProfile | null;
  readonly sample: string;
  readonly isCount: boolean;
}

const SAMPLE_VALUES = 4;

/** How the rows count, and what each column is. */
@Component({
  selector: 'eh-columns-step',
  imports: [GroupedNumberPipe, LayoutForm, ScrollSideways],
  templateUrl: './columns-step.html',
  styleUrl: './columns-step.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ColumnsStep {
  readonly settled = output();

  protected readonly store = inject(NewCutStore);
  protected readonly kinds = COLUMN_KINDS.filter((kind) => kind !== 'count');
  protected readonly kindWords = COLUMN_KIND_WORDS;
  protected readonly rows = computed<readonly ColumnRow[]>(() =>
    (this.store.codeBook()?.columns ?? [])
      .filter(({ id }) => id !== COUNTED_OUTCOME_COLUMN_ID)
      .map((column) => this.row(column)),
  );

  protected rekind(row: ColumnRow, event: Event): void {
    const kind = (event.target as HTMLSelectElement).value as ColumnKind;
    const column = changeKind(row.column, kind, row.contents);
    this.store.codeBook.update((book) => (book === null ? null : replaceColumn(book, column)));
  }

  private row(column: CodeBookColumn): ColumnRow {
    const profile = this.store.profile();
    const contents = profile?.columns.find(({ columnId }) => columnId === column.id) ?? null;
    return {
      column,
      contents,
      sample: contents === null ? 'Not in this file' : sampleOf(contents),
      isCount: column.kind === 'count',
    };
  }
}

function sampleOf({ values, distinct }: ColumnProfile): string {
  const shown = values.slice(0, SAMPLE_VALUES).map(({ value }) => shownCode(value));
  return distinct > shown.length ? `${shown.join(', ')} …` : shown.join(', ');
}
