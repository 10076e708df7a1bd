import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatMenuModule } from '@angular/material/menu';
import { RouterLink } from '@angular/router';
import { keptLevels } from '#shared/analysis';
import type { CodeBookColumn, FactorLevel } from '#shared/code-book';
import { CurrentStudy } from '../../session/current-study';
import { Icon } from '../../ui/marks/icon';
import { PHRASEBOOK } from '../../ui/phrasebook';
import { DESIGN_WORDS } from '../../ui/words';
import { BenchStore } from '../bench/bench-store';
import {
  withEventLevelToggled,
  withExposure,
  withOutcomeColumn,
  withOutcomeWords,
  withReference,
  withStratumToggled,
} from '../draft/analysis-draft';
import { columnById, factorColumns, levelLabels } from '../draft/column-choices';
import { contrastParts, isPicked } from './contrast-parts';
import { CutPicker } from './cut-picker';
import { Pick } from './pick';
import { RestrictionPicker } from './restriction-picker';
import { Reversal } from './reversal';

/** The analysis as a sentence with pickers for words, and what its design means. */
@Component({
  selector: 'eh-contrast-panel',
  imports: [CutPicker, Icon, MatMenuModule, Pick, RestrictionPicker, Reversal, RouterLink],
  templateUrl: './contrast-panel.html',
  styleUrl: './contrast-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ContrastPanel {
  protected readonly store = inject(BenchStore);
  private readonly current = inject(CurrentStudy);
  private readonly book = inject(PHRASEBOOK);

  protected readonly study = this.store.study;
  protected readonly mayManage = computed(() => this.current.may('manageStudy'));
  protected readonly source = computed(() => ({
    draft: this.store.draft(),
    codeBook: this.store.codeBook(),
    outcome: this.store.outcome(),
  }));
  protected readonly parts = computed(() => contrastParts(this.source(), this.book));
  protected readonly columns = computed(() => {
    const codeBook = this.store.codeBook();
    return codeBook === null ? [] : factorColumns(codeBook);
  });
  protected readonly outcomeColumn = computed(() =>
    columnById(this.store.codeBook(), this.store.draft().outcome.columnId),
  );
  protected readonly eventLevels = computed(() => this.levelsOf(this.outcomeColumn()));
  protected readonly eventWords = computed(() => {
    const labels = levelLabels(this.outcomeColumn(), this.store.draft().outcome.eventLevelIds);
    return labels.length === 0 ? 'pick what counts' : labels.join(' or ');
  });
  protected readonly referenceLevels = computed(() =>
    this.levelsOf(columnById(this.store.codeBook(), this.store.draft().exposure.columnId)),
  );
  protected readonly designWords = computed(() => {
    const design = this.study()?.design;
    return design === undefined ? '' : DESIGN_WORDS[design];
  });

  protected isPicked(slot: Parameters<typeof isPicked>[1]): boolean {
    return isPicked(this.source(), slot);
  }

  protected pickOutcome(outcomeId: string): void {
    this.store.change((draft) => withOutcomeWords(draft, outcomeId));
  }

  protected pickOutcomeColumn(column: CodeBookColumn): void {
    this.store.change((draft) => withOutcomeColumn(draft, column));
  }

  /** Several levels may count: the list stays open. */
  protected toggleEvent(levelId: string, event: Event): void {
    event.stopPropagation();
    const column = this.outcomeColumn();
    if (column !== null)
      this.store.change((draft) => withEventLevelToggled(draft, column, levelId));
  }

  protected pickExposure(column: CodeBookColumn): void {
    this.store.change((draft) => withExposure(draft, column));
  }

  protected pickReference(levelId: string): void {
    this.store.change((draft) => withReference(draft, levelId));
  }

  /** Several columns may split the counts: the list stays open. */
  protected toggleStratum(columnId: string, event: Event): void {
    event.stopPropagation();
    const codeBook = this.store.codeBook();
    if (codeBook !== null) {
      this.store.change((draft) => withStratumToggled(draft, codeBook, columnId));
    }
  }

  protected isStratum(columnId: string): boolean {
    return this.store.draft().stratumColumnIds.includes(columnId);
  }

  /** A column that has another role can't split the counts. */
  protected mayBeStratum(columnId: string): boolean {
    const { outcome, exposure, stratumColumnIds } = this.store.draft();
    if (columnId === outcome.columnId || columnId === exposure.columnId) return false;
    return stratumColumnIds.includes(columnId) || stratumColumnIds.length < 3;
  }

  private levelsOf(column: CodeBookColumn | null): readonly FactorLevel[] {
    return column === null ? [] : keptLevels(column, this.store.draft().restrictions);
  }
}
