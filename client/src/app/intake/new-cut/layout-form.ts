import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { ColumnProfile } from '#shared/api';
import { type CodeBook, type CountLayout, setLayout } from '#shared/code-book';
import { COUNT_LAYOUT_WORDS } from '../../ui/code-book-editor/column-words';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { countChoices, layoutOf, layoutSlots } from './count-layouts';

/** How the rows of a file count: one person each, or by one or two columns of counts. */
@Component({
  selector: 'eh-layout-form',
  imports: [Field, FieldControl],
  templateUrl: './layout-form.html',
  styleUrl: './layout-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LayoutForm {
  readonly codeBook = input.required<CodeBook>();
  readonly columns = input.required<readonly ColumnProfile[]>();
  readonly changed = output<CodeBook>();

  protected readonly kinds = Object.keys(COUNT_LAYOUT_WORDS) as CountLayout['kind'][];
  protected readonly words = COUNT_LAYOUT_WORDS;
  protected readonly layout = computed(() => this.codeBook().layout);
  protected readonly choices = computed(() => countChoices(this.columns()));
  protected readonly slots = computed(() => layoutSlots(this.layout()));

  /** A layout needs as many columns of whole numbers as it counts by. */
  protected mayBe(kind: CountLayout['kind']): boolean {
    return layoutOf(kind, this.choices()) !== null;
  }

  protected pick(kind: CountLayout['kind']): void {
    const layout = layoutOf(kind, this.choices());
    if (layout !== null) this.changed.emit(setLayout(this.codeBook(), layout));
  }

  protected count(by: (columnId: string) => CountLayout, event: Event): void {
    const columnId = (event.target as HTMLSelectElement).value;
    this.changed.emit(setLayout(this.codeBook(), by(columnId)));
  }
}
