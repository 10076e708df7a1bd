import { ChangeDetectionStrategy, Component, computed, input, model } from '@angular/core';
import type {
  CodeBook,
  CodeBookColumn,
  CodeBookFinding,
  DecimalMark,
  ProfiledColumn,
} from '#shared/code-book';
import { levelCounts, missingRows } from './column-contents';
import { COLUMN_KIND_WORDS } from './column-words';
import { GroupedNumberPipe } from '../grouped-number-pipe';

/** The columns of a code book; one of them is in view. */
@Component({
  selector: 'eh-column-list',
  imports: [GroupedNumberPipe],
  templateUrl: './column-list.html',
  styleUrl: './column-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ColumnList {
  readonly codeBook = input.required<CodeBook>();
  readonly contents = input<readonly ProfiledColumn[]>([]);
  readonly findings = input<readonly CodeBookFinding[]>([]);
  readonly decimalMark = input<DecimalMark>('.');
  /** The file that the columns come from. */
  readonly fileName = input('');
  readonly columnId = model.required<string | null>();

  protected readonly rows = computed(() =>
    this.codeBook().columns.map((column) => this.row(column)),
  );

  private row(column: CodeBookColumn): ColumnRow {
    const contents = this.contents().find(({ columnId }) => columnId === column.id) ?? null;
    const own = this.findings().filter(({ columnId }) => columnId === column.id);
    return {
      id: column.id,
      label: column.label.trim() || column.name,
      name: column.name,
      kind: COLUMN_KIND_WORDS[column.kind],
      isUsed: column.kind !== 'ignored',
      missing: missingRows(levelCounts(column, contents, this.decimalMark())),
      toSettle: own.length,
      isRefused: own.some(({ severity }) => severity === 'refusal'),
    };
  }
}

interface ColumnRow {
  readonly id: string;
  readonly label: string;
  readonly name: string;
  readonly kind: string;
  readonly isUsed: boolean;
  readonly missing: number | null;
  readonly toSettle: number;
  readonly isRefused: boolean;
}
