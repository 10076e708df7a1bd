import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  linkedSignal,
  model,
} from '@angular/core';
import {
  type CodeBook,
  type CodeBookColumn,
  type CodeBookFinding,
  replaceColumn,
} from '#shared/code-book';
import type { CutProfile } from '#shared/api';
import { ColumnEditor } from './column-editor';
import { ColumnList } from './column-list';

/**
 * Edits a code book, column by column: a list of columns beside the one in view. `[listFoot]` goes
 * below the list, `[columnAction]` beside the column's name.
 */
@Component({
  selector: 'eh-code-book-editor',
  imports: [ColumnEditor, ColumnList],
  template: `
    <eh-column-list
      class="panel"
      [codeBook]="codeBook()"
      [contents]="profile()?.columns ?? []"
      [findings]="findings()"
      [decimalMark]="decimalMark()"
      [fileName]="profile()?.fileName ?? ''"
      [columnId]="shownId()"
      (columnIdChange)="columnId.set($event)"
    >
      <ng-content select="[listFoot]" />
    </eh-column-list>
    @if (column(); as column) {
      <eh-column-editor
        class="panel"
        [column]="column"
        [contents]="contents()"
        [findings]="ownFindings()"
        [decimalMark]="decimalMark()"
        [countNoun]="countNoun()"
        [peopleNoun]="peopleNoun()"
        [readOnly]="readOnly()"
        (changed)="take($event)"
      >
        <ng-content select="[columnAction]" ngProjectAs="[columnAction]" />
      </eh-column-editor>
    }
  `,
  styleUrl: './code-book-editor.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CodeBookEditor {
  readonly codeBook = model.required<CodeBook>();
  /** What the file holds; without it no counts are shown. */
  readonly profile = input<CutProfile | null>(null);
  readonly findings = input<readonly CodeBookFinding[]>([]);
  readonly peopleNoun = input('people');
  readonly readOnly = input(false);
  /** The column in view; null shows the first that has levels. */
  readonly columnId = model<string | null>(null);

  protected readonly decimalMark = computed(() => this.profile()?.usedOptions.decimalMark ?? '.');
  protected readonly shownId = linkedSignal<CodeBook, string | null>({
    source: this.codeBook,
    computation: (book, before) => this.columnId() ?? stillThere(book, before?.value ?? null),
  });
  protected readonly column = computed(() =>
    this.codeBook().columns.find(({ id }) => id === this.shownId()),
  );
  protected readonly contents = computed(
    () => this.profile()?.columns.find(({ columnId }) => columnId === this.shownId()) ?? null,
  );
  protected readonly ownFindings = computed(() =>
    this.findings().filter(({ columnId }) => columnId === this.shownId()),
  );
  /** With counted rows a row is not a person. */
  protected readonly countNoun = computed(() =>
    this.codeBook().layout.kind === 'records' ? this.peopleNoun() : 'rows',
  );

  protected take(column: CodeBookColumn): void {
    this.codeBook.set(replaceColumn(this.codeBook(), column));
  }
}

/** The column that was in view, or one that has something to edit. */
function stillThere({ columns }: CodeBook, shownId: string | null): string | null {
  if (columns.some(({ id }) => id === shownId)) return shownId;
  const useful = columns.find(({ levels }) => levels.length > 0) ?? columns[0];
  return useful?.id ?? null;
}
