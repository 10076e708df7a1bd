import { LiveAnnouncer } from '@angular/cdk/a11y';
import { computed, inject, Injectable } from '@angular/core';
import { type Block, runsOf, type Step, withFieldValue } from '#shared/report';
import type { Framing } from '#shared/wording';
import { CurrentStudy } from '../../session/current-study';
import { FRAMING_WORDS } from '../../ui/framing/framing-rail';
import { BlockActions } from '../block-actions/block-actions';
import { FRAMING_PATH, hasFraming, ownFraming } from '../block-editors/block-content';
import { ProofDesk } from '../proof/proof-desk';
import { ReportProof } from '../proof/report-proof';
import { ReportState } from '../report-store/report-state';
import { ReportStore } from '../report-store/report-store';

/** What leads in the effects of the report, and which blocks differ. */
@Injectable()
export class ReportFraming {
  private readonly store = inject(ReportStore);
  private readonly state = inject(ReportState);
  private readonly actions = inject(BlockActions);
  private readonly desk = inject(ProofDesk);
  private readonly proof = inject(ReportProof);
  private readonly study = inject(CurrentStudy);
  private readonly announcer = inject(LiveAnnouncer);

  readonly framing = computed(() => this.store.report()?.framing ?? 'both');
  readonly maySet = computed(() => this.state.isOpen() && this.study.may('setFraming'));
  readonly differing = computed(() =>
    this.store.blocks().filter((block) => {
      const own = ownFraming(block);
      return own !== null && own !== this.framing();
    }),
  );

  /** Sets what the whole report says. */
  say(framing: Framing): void {
    if (!this.maySet() || framing === this.framing()) return;
    if (this.actions.make([{ kind: 'setFraming', framing }])) this.announce(framing);
  }

  /** Sets what the sentence in hand says; without one, what the report says. */
  sayInHand(framing: Framing): void {
    const block = this.blockInHand();
    if (block === null) this.say(framing);
    else this.sayOf(block, framing);
  }

  /** A block that says what the report says follows it from then on. */
  sayOf(block: Block, framing: Framing | null): void {
    const own = framing === this.framing() ? null : framing;
    if (!this.actions.mayChangeKind(block.kind) || ownFraming(block) === own) return;
    if (this.actions.make([framingStep(block, own)])) this.announce(framing ?? this.framing());
  }

  /** Lets every block that differs follow the report again. */
  followAll(): void {
    const blocks = this.differing().filter((block) => this.actions.mayChangeKind(block.kind));
    if (blocks.length > 0) this.actions.make(blocks.map((block) => framingStep(block, null)));
  }

  private blockInHand(): Block | null {
    const block = this.store.block(this.desk.selected() ?? '');
    return block !== undefined && hasFraming(block) ? block : null;
  }

  /** Reads out how the sentence in hand, or else the first one, says it now. */
  private announce(framing: Framing): void {
    const block = this.blockInHand() ?? this.store.blocks().find(hasFraming);
    const elements = block === undefined ? [] : this.proof.of(block.id).elements;
    const sentence = elements
      .flatMap(runsOf)
      .map((run) => run.text)
      .join('');
    void this.announcer.announce(`${FRAMING_WORDS[framing]}. ${sentence}`, 'polite');
  }
}

function framingStep(block: Block, framing: Framing | null): Step {
  const content = withFieldValue(block.content, FRAMING_PATH, framing);
  return { kind: 'replaceContent', blockId: block.id, baseVersion: block.version, content };
}
