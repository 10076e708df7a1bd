import { LiveAnnouncer } from '@angular/cdk/a11y';
import { inject, Injectable } from '@angular/core';
import { ProofDesk } from '../proof/proof-desk';
import { ReportProof } from '../proof/report-proof';
import { ReportState } from '../report-store/report-state';
import { blockSources, countWords } from './block-sources';

/** Shows where the number in focus, or the block in hand, comes from; and says it aloud. */
@Injectable()
export class SourceReader {
  private readonly desk = inject(ProofDesk);
  private readonly proof = inject(ReportProof);
  private readonly state = inject(ReportState);
  private readonly announcer = inject(LiveAnnouncer);

  show(): void {
    const blockId = this.desk.spotlight()?.blockId ?? this.desk.selected();
    if (blockId === null) return;
    this.desk.margin.set('sources');
    this.desk.sourcesOpen.update((open) => !open);
    this.desk.litBlockId.update((lit) => (lit === blockId ? null : blockId));
    const sources = blockSources(this.proof.of(blockId), this.state.pins());
    const words =
      sources === null
        ? 'This block prints no number.'
        : [sources.name, ...sources.lines, countWords(sources.count)].join('. ');
    void this.announcer.announce(words, 'polite');
  }
}
