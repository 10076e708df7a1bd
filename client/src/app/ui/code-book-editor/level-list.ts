import {
  type CdkDragDrop,
  CdkDrag,
  CdkDragHandle,
  CdkDragPlaceholder,
  CdkDropList,
} from '@angular/cdk/drag-drop';
import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  Injector,
  input,
  linkedSignal,
  output,
  signal,
} from '@angular/core';
import { MatMenuModule } from '@angular/material/menu';
import {
  type CodeBookColumn,
  codeBookEditMessage,
  type EditedColumn,
  FACTOR_SOURCE,
  type LevelWords,
  markMissing,
  mergeLevels,
  moveLevel,
  renameLevel,
  setReference,
  splitLevel,
} from '#shared/code-book';
import { Icon } from '../marks/icon';
import { counted } from '../words';
import type { LevelCounts } from './column-contents';
import { shownCode } from './column-words';
import { type LevelRow, levelRows } from './level-rows';
import { GroupedNumberPipe } from '../grouped-number-pipe';

/** The levels or bands of a column: words, order, reference; merging and taking apart. */
@Component({
  selector: 'eh-level-list',
  imports: [
    CdkDrag,
    CdkDragHandle,
    CdkDragPlaceholder,
    CdkDropList,
    GroupedNumberPipe,
    Icon,
    MatMenuModule,
  ],
  templateUrl: './level-list.html',
  styleUrl: './level-list.scss',
  host: { '(keydown)': 'press($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LevelList {
  readonly column = input.required<CodeBookColumn>();
  readonly counts = input.required<LevelCounts>();
  /** What is counted, in the plural: "workers", or "rows". */
  readonly countNoun = input('rows');
  readonly readOnly = input(false);
  readonly changed = output<CodeBookColumn>();

  protected readonly rows = computed(() => levelRows(this.column(), this.counts()));
  protected readonly movable = computed(
    () => !this.readOnly() && FACTOR_SOURCE[this.column().kind] === 'levels',
  );
  protected readonly countHead = computed(
    () => this.countNoun().charAt(0).toUpperCase() + this.countNoun().slice(1),
  );
  protected readonly partsWords = computed(() =>
    FACTOR_SOURCE[this.column().kind] === 'bands'
      ? counted(this.rows().length, 'band', 'bands')
      : counted(this.rows().length, 'level', 'levels'),
  );
  protected readonly picked = linkedSignal<string, ReadonlySet<string>>({
    source: () => this.column().id,
    computation: () => new Set(),
  });
  protected readonly said = signal('');
  protected readonly problem = signal('');

  private readonly element = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly injector = inject(Injector);

  protected drop(event: CdkDragDrop<unknown>): void {
    const row = this.rows()[event.previousIndex];
    if (row !== undefined && event.previousIndex !== event.currentIndex) {
      this.move(row, event.currentIndex);
    }
  }

  /** Alt with an arrow moves the level that the focus is in. */
  protected press(event: KeyboardEvent): void {
    const step = event.key === 'ArrowUp' ? -1 : event.key === 'ArrowDown' ? 1 : 0;
    if (!event.altKey || step === 0 || !this.movable()) return;
    const within = (event.target as HTMLElement).closest<HTMLElement>('[data-level]');
    const at = this.rows().findIndex(({ id }) => id === within?.dataset.level);
    const row = this.rows()[at];
    if (row === undefined) return;
    event.preventDefault();
    this.moveBy(row, at, step);
  }

  protected moveBy(row: LevelRow, at: number, step: number): void {
    const to = at + step;
    if (to >= 0 && to < this.rows().length) this.move(row, to);
  }

  protected rename(row: LevelRow, words: LevelWords): void {
    this.apply(renameLevel(this.column(), row.id, words));
  }

  protected makeReference(row: LevelRow): void {
    this.apply(setReference(this.column(), row.id));
    this.said.set(`${row.label} is the reference.`);
  }

  protected pick(row: LevelRow, event: Event): void {
    const picked = new Set(this.picked());
    if ((event.target as HTMLInputElement).checked) picked.add(row.id);
    else picked.delete(row.id);
    this.picked.set(picked);
  }

  protected merge(): void {
    const ids = this.rows()
      .map(({ id }) => id)
      .filter((id) => this.picked().has(id));
    if (!this.apply(mergeLevels(this.column(), ids, {}))) return;
    this.picked.set(new Set());
    this.said.set(`${ids.length} levels are one now.`);
    this.focusLater(`label-${ids[0] ?? ''}`);
  }

  protected split(row: LevelRow): void {
    const isSplit = this.apply(splitLevel(this.column(), row.id));
    if (isSplit) this.said.set(`${row.label} is taken apart.`);
  }

  /** Every code of the level leaves it; the reasons can be worded in the list below. */
  protected countAsMissing(row: LevelRow): void {
    const codes = this.column().levels.find(({ id }) => id === row.id)?.codes ?? [];
    const edited = codes.reduce<EditedColumn>(
      (outcome, code) => (outcome.ok ? markMissing(outcome.value, code, row.label) : outcome),
      { ok: true, value: this.column() },
    );
    const shown = codes.map(shownCode).join(', ');
    if (this.apply(edited)) this.said.set(`${shown} counts as missing now.`);
  }

  protected valueOf(event: Event): string {
    return (event.target as HTMLInputElement).value;
  }

  private move(row: LevelRow, to: number): void {
    const focused = this.element.ownerDocument.activeElement;
    if (!this.apply(moveLevel(this.column(), row.id, to))) return;
    this.said.set(`${row.label} is now ${to + 1} of ${this.rows().length}.`);
    // A row that moves in the page loses the focus, which the next key needs.
    if (focused !== null && this.element.contains(focused)) this.refocus(focused as HTMLElement);
  }

  private apply(outcome: EditedColumn): boolean {
    this.problem.set(outcome.ok ? '' : codeBookEditMessage(outcome.issue));
    if (outcome.ok) this.changed.emit(outcome.value);
    return outcome.ok;
  }

  private refocus(element: HTMLElement): void {
    afterNextRender(
      () => {
        element.focus();
      },
      { injector: this.injector },
    );
  }

  private focusLater(id: string): void {
    afterNextRender(
      () => {
        this.element.ownerDocument.getElementById(id)?.focus();
      },
      { injector: this.injector },
    );
  }
}
