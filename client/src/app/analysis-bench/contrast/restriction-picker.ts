import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatMenuModule } from '@angular/material/menu';
import { type CodeBookColumn, factorLevels } from '#shared/code-book';
import { BenchStore } from '../bench/bench-store';
import { withRestriction } from '../draft/analysis-draft';
import { columnById, factorColumns, levelLabels } from '../draft/column-choices';
import { Pick } from './pick';

/** Which records are counted: all of them, or those with some levels of some columns. */
@Component({
  selector: 'eh-restriction-picker',
  imports: [MatMenuModule, Pick],
  templateUrl: './restriction-picker.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RestrictionPicker {
  protected readonly store = inject(BenchStore);
  protected readonly columns = computed(() => {
    const codeBook = this.store.codeBook();
    return codeBook === null ? [] : factorColumns(codeBook);
  });
  protected readonly words = computed(() => {
    const { restrictions } = this.store.draft();
    if (restrictions.length === 0) return 'all records';
    return restrictions
      .map(({ columnId, levelIds }) => {
        const column = columnById(this.store.codeBook(), columnId);
        return `${column?.label ?? columnId}: ${levelLabels(column, levelIds).join(' or ')}`;
      })
      .join('; ');
  });

  protected levels(column: CodeBookColumn): ReturnType<typeof factorLevels> {
    return factorLevels(column);
  }

  protected isKept(column: CodeBookColumn, levelId: string): boolean {
    const own = this.store.draft().restrictions.find(({ columnId }) => columnId === column.id);
    return own === undefined || own.levelIds.includes(levelId);
  }

  /** At least one level stays; with every level kept there is no restriction. */
  protected toggle(column: CodeBookColumn, levelId: string, event: Event): void {
    event.stopPropagation();
    const ids = factorLevels(column).map(({ id }) => id);
    const kept = ids.filter((id) => this.isKept(column, id) !== (id === levelId));
    if (kept.length === 0) return;
    const levelIds = kept.length === ids.length ? null : kept;
    this.store.change((draft) => withRestriction(draft, column.id, levelIds));
  }

  protected keepAll(): void {
    this.store.change((draft) => ({ ...draft, restrictions: [] }));
  }
}
