import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { type Block, BLOCK_KINDS, type EffectSentenceContent } from '#shared/report';
import { balanceOf, claimOf, type Framing } from '#shared/wording';
import { BalancePanel } from '../../../ui/balance/balance-panel';
import { FRAMING_WORDS } from '../../../ui/framing/framing-rail';
import { PHRASEBOOK } from '../../../ui/phrasebook';
import { BlockActions } from '../../block-actions/block-actions';
import { ReportFraming } from '../../report-page/report-framing';
import { ReportState } from '../../report-store/report-state';

/** Both sizes of the effect under its sentence; here the sentence may differ from the report. */
@Component({
  selector: 'eh-effect-balance',
  imports: [BalancePanel],
  template: `
    @if (balance(); as balance) {
      <eh-balance-panel
        [balance]="balance"
        [framing]="framing()"
        [disabled]="!mayFrame()"
        (framingChange)="say($event)"
      />
      @if (own(); as own) {
        <p>
          This sentence says {{ words[own].toLowerCase() }}; the report says
          {{ words[reportFraming()].toLowerCase() }}.
          @if (mayFrame()) {
            <button type="button" class="text-button" (click)="say(null)">Follow the report</button>
          }
        </p>
      }
    }
  `,
  styles: `
    :host {
      display: block;
      padding-top: 8px;
    }
    p {
      padding-top: 4px;
      color: var(--ink-2);
      font: var(--t-note);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EffectBalance {
  private readonly state = inject(ReportState);
  private readonly actions = inject(BlockActions);
  private readonly framings = inject(ReportFraming);
  private readonly phrasebook = inject(PHRASEBOOK);

  readonly block = input.required<Block>();

  protected readonly words = FRAMING_WORDS;
  private readonly content = computed((): EffectSentenceContent | null => {
    const content = BLOCK_KINDS.effectSentence.parseContent(this.block().content);
    return content.ok ? content.value : null;
  });
  protected readonly reportFraming = computed(() => this.state.report()?.framing ?? 'both');
  protected readonly own = computed(() => this.content()?.framing ?? null);
  protected readonly framing = computed(() => this.own() ?? this.reportFraming());
  protected readonly mayFrame = computed(() => this.actions.mayChangeKind(this.block().kind));
  protected readonly balance = computed(() => {
    const content = this.content();
    const houseStyle = this.state.houseStyle();
    const pin = this.state.pins().get(content?.analysisId ?? '');
    if (content === null || houseStyle === null || pin === undefined) return null;
    const { analysisId } = pin;
    const { indexLevelId, scope } = content;
    if (indexLevelId === null) return null;
    const claim = claimOf(pin.result, { analysisId, indexLevelId, scope });
    return claim.ok ? balanceOf(claim.value, houseStyle, this.phrasebook) : null;
  });

  /** Null follows the report. */
  protected say(framing: Framing | null): void {
    this.framings.sayOf(this.block(), framing);
  }
}
