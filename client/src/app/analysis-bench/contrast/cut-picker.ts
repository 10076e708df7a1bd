import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatMenuModule } from '@angular/material/menu';
import { shortDate } from '../../ui/dates';
import { BenchStore } from '../bench/bench-store';
import { Pick } from './pick';

/** Which cut the records come from. */
@Component({
  selector: 'eh-cut-picker',
  imports: [MatMenuModule, Pick],
  template: `
    <eh-pick
      name="Data cut"
      [words]="words()"
      [picked]="store.cut() !== null"
      [list]="cuts"
      [disabled]="!store.mayEdit()"
    />
    <mat-menu #cuts="matMenu" class="pick-list">
      @for (choice of choices(); track choice.id) {
        <button
          mat-menu-item
          role="menuitemradio"
          [attr.aria-checked]="choice.id === store.cutId()"
          (click)="store.cutId.set(choice.id)"
        >
          {{ choice.words }}
        </button>
      } @empty {
        <button mat-menu-item disabled>No data yet. Load a file first.</button>
      }
    </mat-menu>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CutPicker {
  protected readonly store = inject(BenchStore);
  protected readonly words = computed(() => {
    const place = this.store.cut();
    return place === null ? 'pick a cut' : `${place.dataSet.name}, cut ${place.cut.number}`;
  });
  protected readonly choices = computed(() =>
    this.store.dataSets().flatMap(({ name, cuts }) =>
      cuts
        .toSorted((one, other) => other.number - one.number)
        .map(({ id, number, dataDate }) => ({
          id,
          words: `${name}, cut ${number}, ${shortDate(dataDate)}`,
        })),
    ),
  );
}
