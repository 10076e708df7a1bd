import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  untracked,
} from '@angular/core';
import { RouterLink } from '@angular/router';
import { CurrentStudy } from '../session/current-study';
import { Bar, BarActions, BarBeside } from '../ui/bar/bar';
import { CodeBookEditor } from '../ui/code-book-editor/code-book-editor';
import { shortDate } from '../ui/dates';
import { MarginNote } from '../ui/status/margin-note';
import { ProblemPanel } from '../ui/status/problem-panel';
import { columnDifferences } from './code-book-differences';
import { CodeBookStore } from './code-book-store';

/** The code book of a data set. */
@Component({
  selector: 'eh-code-book-page',
  imports: [Bar, BarActions, BarBeside, CodeBookEditor, MarginNote, ProblemPanel, RouterLink],
  providers: [CodeBookStore],
  templateUrl: './code-book-page.html',
  styleUrl: './code-book-page.scss',
  host: { '(window:beforeunload)': 'warn($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CodeBookPage {
  readonly dataSetId = input.required<string>();

  protected readonly store = inject(CodeBookStore);
  private readonly current = inject(CurrentStudy);

  protected readonly study = this.current.study;
  protected readonly mayEdit = computed(() => this.current.may('editData'));
  protected readonly home = computed(() => ['/studies', this.study()?.id ?? '']);
  protected readonly cutWords = computed(() => {
    const cut = this.store.cut();
    return cut === null ? '' : `Cut ${cut.number}, ${shortDate(cut.dataDate)}`;
  });
  protected readonly differences = computed(() => {
    const [mine, theirs] = [this.store.onTop(), this.store.theirs()];
    return mine === null || theirs === null ? [] : columnDifferences(mine, theirs.content);
  });
  protected readonly maySave = computed(
    () => this.store.isChanged() && this.store.refusals().length === 0 && !this.store.saving(),
  );

  constructor() {
    effect(() => {
      const dataSetId = this.dataSetId();
      untracked(() => {
        this.store.open(dataSetId);
      });
    });
  }

  /** Asked by the router before it leaves. */
  hasUnsavedWork(): boolean {
    return this.mayEdit() && this.store.isChanged();
  }

  protected warn(event: BeforeUnloadEvent): void {
    if (this.hasUnsavedWork()) event.preventDefault();
  }

  protected columnName(columnId: string | null): string {
    const column = this.store.codeBook()?.columns.find(({ id }) => id === columnId);
    return column?.label ?? 'The code book';
  }
}
