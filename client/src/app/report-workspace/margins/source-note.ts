import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { RouterLink } from '@angular/router';
import { CurrentStudy } from '../../session/current-study';
import { BlockActions } from '../block-actions/block-actions';
import { ProofDesk } from '../proof/proof-desk';
import type { PrintedBlock } from '../proof/printed-block';
import { ReportProof } from '../proof/report-proof';
import { ReportState } from '../report-store/report-state';
import { blockSources, countWords, inStepWith } from './block-sources';

/** Where the numbers of a block come from, in the left margin, tied to the block by a bracket. */
@Component({
  selector: 'eh-source-note',
  imports: [RouterLink],
  templateUrl: './source-note.html',
  styleUrl: './source-note.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SourceNote {
  private readonly state = inject(ReportState);
  private readonly proof = inject(ReportProof);
  private readonly desk = inject(ProofDesk);
  private readonly study = inject(CurrentStudy);

  private readonly actions = inject(BlockActions);
  private readonly unfolded = signal(false);

  readonly blockId = input.required<string>();
  readonly printed = input.required<PrintedBlock | null>();
  readonly selected = input.required<boolean>();

  protected readonly sources = computed(() => {
    const printed = this.printed();
    return printed === null ? null : blockSources(printed, this.state.pins());
  });
  protected readonly words = computed(() => {
    const sources = this.sources();
    return sources === null ? '' : countWords(sources.count);
  });
  protected readonly partly = computed(() => {
    const count = this.sources()?.count;
    return count !== undefined && count.typed + count.missing > 0;
  });
  protected readonly step = computed(() =>
    inStepWith(this.blockId(), this.proof.blocks(), this.proof.captionedPlaces()),
  );
  protected readonly lit = computed(() => {
    const ids = this.sources()?.analysisIds ?? [];
    const spot = this.desk.spotlight();
    return (
      spot?.blockId === this.blockId() &&
      spot.addresses.some(({ analysisId }) => ids.includes(analysisId))
    );
  });
  protected readonly studyId = computed(() => this.study.study()?.id ?? '');

  /** Where the margin is a bracket only, the note opens over the page. */
  protected readonly open = computed(
    () => this.unfolded() || (this.selected() && this.desk.sourcesOpen()),
  );
  protected readonly name = computed(() => this.actions.nameOf(this.blockId()));

  protected unfold(): void {
    this.unfolded.update((unfolded) => !unfolded);
  }

  protected fold(): void {
    this.unfolded.set(false);
  }

  /** A note under the pointer lights its numbers in the block. */
  protected light(on: boolean): void {
    this.desk.litBlockId.set(on ? this.blockId() : null);
  }
}
