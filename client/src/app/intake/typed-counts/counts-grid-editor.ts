import {
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  input,
  model,
  signal,
} from '@angular/core';
import { Icon } from '../../ui/marks/icon';
import type { GridProblem } from './checked-grid';
import {
  columnCount,
  type CountsGrid,
  type CountsLayout,
  type GridPlace,
  textAt,
  withoutRow,
  withoutStratum,
  withRow,
  withStratum,
  withStratumName,
  withText,
} from './counts-grid';
import { arrivalOf } from './grid-keys';
import { isBlock, pastedInto } from './pasted-counts';

const PAIR_HEADS: Readonly<Record<CountsLayout, readonly [string, string]>> = {
  eventsAndTotal: ['Events', 'Total'],
  casesAndControls: ['Cases', 'Controls'],
};

/** A grid to type or paste counts into: levels down, two counts a stratum across. */
@Component({
  selector: 'eh-counts-grid-editor',
  imports: [Icon],
  templateUrl: './counts-grid-editor.html',
  styleUrl: './counts-grid-editor.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CountsGridEditor {
  readonly grid = model.required<CountsGrid>();
  readonly layout = input.required<CountsLayout>();
  readonly problems = input<readonly GridProblem[]>([]);

  protected readonly pasteNote = signal('');
  protected readonly heads = computed(() => PAIR_HEADS[this.layout()]);
  protected readonly columns = computed(() =>
    Array.from({ length: columnCount(this.grid()) - 1 }, (_, at) => at + 1),
  );
  private readonly element = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;

  protected text(row: number, column: number): string {
    return textAt(this.grid(), { row, column });
  }

  protected nameOf(row: number, column: number): string {
    const level = this.text(row, 0).trim() || `level ${row + 1}`;
    if (column === 0) return `Name of level ${row + 1}`;
    const stratum = this.stratumName(Math.floor((column - 1) / 2));
    const head = this.heads()[(column - 1) % 2 === 0 ? 0 : 1];
    return [level, stratum, head.toLowerCase()].filter((part) => part !== '').join(', ');
  }

  protected stratumName(stratum: number): string {
    if (!this.grid().stratified) return '';
    const name = this.grid().strata[stratum]?.trim() ?? '';
    return name === '' ? `stratum ${stratum + 1}` : name;
  }

  protected problemAt(row: number, column: number): string | null {
    const found = this.problems().find(({ place }) => place.row === row && place.column === column);
    return found?.message ?? null;
  }

  protected problemsOfRow(row: number): readonly GridProblem[] {
    return this.problems().filter(({ place }) => place.row === row);
  }

  protected type(place: GridPlace, event: Event): void {
    this.grid.set(withText(this.grid(), place, (event.target as HTMLInputElement).value));
  }

  protected nameStratum(stratum: number, event: Event): void {
    const name = (event.target as HTMLInputElement).value;
    this.grid.set(withStratumName(this.grid(), stratum, name));
  }

  protected paste(place: GridPlace, event: ClipboardEvent): void {
    const text = event.clipboardData?.getData('text/plain') ?? '';
    if (!isBlock(text)) return;
    event.preventDefault();
    const { grid, columnsLeftOver } = pastedInto(this.grid(), place, text);
    this.grid.set(grid);
    this.pasteNote.set(pasteWords(columnsLeftOver));
  }

  protected press(place: GridPlace, event: KeyboardEvent): void {
    const arrival = arrivalOf(event, place);
    if (arrival === null) return;
    event.preventDefault();
    if (event.key === 'Enter' && arrival.row === this.grid().rows.length) this.addRow();
    else this.focus(arrival);
  }

  protected addRow(): void {
    this.grid.set(withRow(this.grid()));
    const row = this.grid().rows.length - 1;
    setTimeout(() => {
      this.focus({ row, column: 0 });
    });
  }

  protected removeRow(row: number): void {
    this.grid.set(withoutRow(this.grid(), row));
  }

  protected addStratum(): void {
    this.grid.set(withStratum(this.grid()));
  }

  protected removeStratum(stratum: number): void {
    this.grid.set(withoutStratum(this.grid(), stratum));
  }

  private focus({ row, column }: GridPlace): void {
    const cell = this.element.querySelector<HTMLInputElement>(`#cell-${row}-${column}`);
    cell?.focus();
    cell?.select();
  }
}

function pasteWords(columnsLeftOver: number): string {
  if (columnsLeftOver === 0) return 'Pasted.';
  const columns = columnsLeftOver === 1 ? '1 column' : `${columnsLeftOver} columns`;
  return `Pasted, but ${columns} found no place. Add a stratum first, or paste further left.`;
}
