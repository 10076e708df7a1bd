import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { CurrentStudy } from '../../session/current-study';
import { ProofDesk } from '../proof/proof-desk';
import { ReportProof } from '../proof/report-proof';
import { ReportState } from '../report-store/report-state';
import { blockSources, countWords, inStepWith } from './block-sources';

/** Where the numbers of a block come from, in the left margin, tied to the block by a bracket. */
@Component({
  selector: 'eh-source-note',
  imports: [RouterLink],
  template: `
    @if (sources(); as sources) {
      <div class="note" [class.lit]="lit()" (mouseenter)="light(true)" (mouseleave)="light(false)">
        <b>{{ sources.name }}</b>
        @for (line of sources.lines; track line) {
          <span class="line">{{ line }}</span>
        }
        <span class="count">
          <i class="dot" [class.partly]="partly()" aria-hidden="true"></i>
          {{ words() }}
        </span>
        @if (step(); as step) {
          <span class="count line">
            <i class="dot" aria-hidden="true"></i>
            In step with {{ step }}
          </span>
        }
        @if (selected() && sources.analysisIds.length === 1) {
          <a
            class="text-button"
            [routerLink]="['/studies', studyId(), 'analyses', sources.analysisIds[0]]"
          >
            Open the analysis
          </a>
        }
      </div>
    }
  `,
  styleUrl: './source-note.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SourceNote {
  private readonly state = inject(ReportState);
  private readonly proof = inject(ReportProof);
  private readonly desk = inject(ProofDesk);
  private readonly study = inject(CurrentStudy);

  readonly blockId = input.required<string>();
  readonly selected = input.required<boolean>();

  private readonly printed = computed(() => this.proof.of(this.blockId()));
  protected readonly sources = computed(() => blockSources(this.printed(), this.state.pins()));
  protected readonly words = computed(() => {
    const sources = this.sources();
    return sources === null ? '' : countWords(sources.count);
  });
  protected readonly partly = computed(() => {
    const count = this.sources()?.count;
    return count !== undefined && count.typed + count.missing > 0;
  });
  protected readonly step = computed(() => {
    const other = inStepWith(this.printed(), this.proof.blocks());
    return other === null ? null : `${other.caption.label} ${other.caption.number}`;
  });
  protected readonly lit = computed(() => {
    const ids = this.sources()?.analysisIds ?? [];
    const spot = this.desk.spotlight();
    return (
      spot?.blockId === this.blockId() &&
      spot.addresses.some(({ analysisId }) => ids.includes(analysisId))
    );
  });
  protected readonly studyId = computed(() => this.study.study()?.id ?? '');

  /** A note under the pointer lights its numbers in the block. */
  protected light(on: boolean): void {
    this.desk.litBlockId.set(on ? this.blockId() : null);
  }
}
