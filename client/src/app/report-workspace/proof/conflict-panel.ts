import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { LayoutElement } from '#shared/layout';
import { type Block, composeReport } from '#shared/report';
import { Notices } from '../../ui/notices/notices';
import { PHRASEBOOK } from '../../ui/phrasebook';
import { ProofElement } from '../../ui/proof/proof-element';
import type { EditConflict } from '../report-store/edit-conflict';
import { ReportState } from '../report-store/report-state';
import { ReportStore } from '../report-store/report-store';

/** Two versions of a block, for the person to choose from. Nothing is lost either way. */
@Component({
  selector: 'eh-conflict-panel',
  imports: [ProofElement],
  template: `
    <section role="alert">
      <h3>{{ heading() }}</h3>
      <div class="versions">
        <div class="version">
          <p class="whose">Yours</p>
          @for (element of mine(); track $index) {
            <eh-proof-element [element]="element" />
          }
          <button type="button" class="button small" (click)="keepMine()">Keep mine</button>
        </div>
        <div class="version">
          <p class="whose">{{ conflict().author ?? 'The newer version' }}</p>
          @if (removed()) {
            <p class="gone">Took this block out.</p>
          }
          @for (element of theirs(); track $index) {
            <eh-proof-element [element]="element" />
          }
          <button type="button" class="button small" (click)="takeTheirs()">Take theirs</button>
        </div>
      </div>
    </section>
  `,
  styleUrl: './conflict-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ConflictPanel {
  private readonly store = inject(ReportStore);
  private readonly state = inject(ReportState);
  private readonly notices = inject(Notices);
  private readonly phrasebook = inject(PHRASEBOOK);

  readonly block = input.required<Block>();
  readonly conflict = input.required<EditConflict>();

  protected readonly removed = computed(() => this.block().removedAt !== null);
  protected readonly heading = computed(() => {
    const author = this.conflict().author ?? 'Somebody';
    return `${author} changed this block while you did. Choose the version that stands.`;
  });
  protected readonly mine = computed(() => this.printed(this.conflict().mine));
  protected readonly theirs = computed(() =>
    this.removed() ? [] : this.printed(this.block().content),
  );

  protected keepMine(): void {
    this.store.keepMine(this.conflict());
  }

  protected takeTheirs(): void {
    const conflict = this.conflict();
    this.store.takeTheirs(conflict);
    this.notices.offer('The newer version stands.', 'Put mine back', () =>
      this.store.keepMine(conflict),
    );
  }

  /** Printed within the whole report, so that references and numbers are as they will be. */
  private printed(content: unknown): readonly LayoutElement[] {
    const report = this.state.report();
    const houseStyle = this.state.houseStyle();
    if (report === null || houseStyle === null) return [];
    const blockId = this.block().id;
    const blocks = report.blocks.map((block) =>
      block.id === blockId ? { ...block, removedAt: null, content } : block,
    );
    const pins = this.state.pins();
    const shown = Object.fromEntries([...pins].map(([id, pin]) => [id, pin.resultId]));
    const composed = composeReport({
      report: { ...report, blocks, pins: shown },
      pins: pins.values(),
      houseStyle,
      phrasebook: this.phrasebook,
    });
    return composed.elements.filter((element) => element.blockId === blockId);
  }
}
