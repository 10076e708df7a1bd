import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { TableElement, TableHeadCell } from '#shared/layout';
import { ScrollSideways } from '../scroll-sideways';
import { ProofRuns } from './proof-runs';
import { tableSections } from './table-sections';

/** A three-rule table: caption above, rules at top, head and foot, notes below. */
@Component({
  selector: 'eh-proof-table',
  imports: [ProofRuns, ScrollSideways],
  templateUrl: './proof-table.html',
  styleUrl: './proof-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProofTable {
  readonly table = input.required<TableElement>();
  readonly referenceFollowed = output<string>();

  protected readonly name = computed(() => {
    const { label, number } = this.table().caption;
    return `${label} ${number}`;
  });
  protected readonly sections = computed(() => tableSections(this.table()));

  protected scopeOf(cell: TableHeadCell): 'col' | 'colgroup' {
    return cell.columnSpan > 1 ? 'colgroup' : 'col';
  }
}
