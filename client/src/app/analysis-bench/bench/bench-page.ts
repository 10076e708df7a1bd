import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  untracked,
} from '@angular/core';
import { RouterLink } from '@angular/router';
import { CurrentStudy } from '../../session/current-study';
import { Bar, BarActions, BarBeside } from '../../ui/bar/bar';
import { shortDate } from '../../ui/dates';
import { Dialogs } from '../../ui/dialog/dialogs';
import { Confirm } from '../../ui/dialog/confirm';
import { PHRASEBOOK } from '../../ui/phrasebook';
import { EmptyState } from '../../ui/status/empty-state';
import { ProblemPanel } from '../../ui/status/problem-panel';
import { counted } from '../../ui/words';
import { ContrastPanel } from '../contrast/contrast-panel';
import { OutsidePanel } from '../outside/outside-panel';
import { CountsPanel } from '../panels/counts-panel';
import { EstimatesPanel } from '../panels/estimates-panel';
import { FurtherPanel } from '../panels/further-panel';
import { GuardsPanel } from '../panels/guards-panel';
import { MethodsPanel } from '../panels/methods-panel';
import { PooledPanel } from '../panels/pooled-panel';
import { SayPanel } from '../panels/say-panel';
import { SettingPanel } from '../panels/setting-panel';
import { ComputedAnswers } from '../computing/computed-answers';
import { Computing } from '../computing/computing';
import { AnalysisKeeper } from './analysis-keeper';
import { BenchLoader } from './bench-loader';
import { BenchStore } from './bench-store';
import { CountsStore } from './counts-store';
import { impossibleWords, whatToPick } from './impossible-words';
import { StaleAnalysis } from './stale-analysis';

/** The analysis bench: a contrast is picked as a sentence, and everything follows it. */
@Component({
  selector: 'eh-bench-page',
  imports: [
    Bar,
    BarActions,
    BarBeside,
    ContrastPanel,
    CountsPanel,
    EmptyState,
    EstimatesPanel,
    FurtherPanel,
    GuardsPanel,
    MethodsPanel,
    OutsidePanel,
    PooledPanel,
    ProblemPanel,
    RouterLink,
    SayPanel,
    SettingPanel,
    StaleAnalysis,
  ],
  providers: [AnalysisKeeper, BenchLoader, BenchStore, ComputedAnswers, Computing, CountsStore],
  templateUrl: './bench-page.html',
  styleUrl: './bench-page.scss',
  host: { '(window:beforeunload)': 'warn($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BenchPage {
  /** From the address; `new` opens an empty bench. */
  readonly analysisId = input.required<string>();

  protected readonly store = inject(BenchStore);
  protected readonly loader = inject(BenchLoader);
  protected readonly keeper = inject(AnalysisKeeper);
  private readonly current = inject(CurrentStudy);
  private readonly dialogs = inject(Dialogs);
  private readonly confirm = inject(Confirm);
  private readonly book = inject(PHRASEBOOK);

  protected readonly study = this.store.study;
  protected readonly home = computed(() => ['/studies', this.study()?.id ?? '']);
  protected readonly heading = computed(() => {
    const saved = this.store.saved();
    const name = this.store.name().trim() || this.store.suggestedName();
    if (saved === null) return 'New analysis';
    return `Analysis ${saved.number}: ${name}`;
  });
  protected readonly cutWords = computed(() => {
    const place = this.store.cut();
    return place === null ? '' : `Cut ${place.cut.number}, ${shortDate(place.cut.dataDate)}`;
  });
  protected readonly uses = computed(() =>
    (this.store.saved()?.usedIn ?? []).map(({ reportId, title, blocks }) => ({
      reportId,
      title,
      blocks: counted(blocks, 'block', 'blocks'),
    })),
  );
  /** Whoever places tables also places figures and sentences. */
  protected readonly mayUse = computed(
    () =>
      this.current.may('editNumbersBlocks') &&
      this.store.saved() !== null &&
      !this.keeper.isChanged(),
  );
  protected readonly missing = computed(() => whatToPick(this.store));
  protected readonly impossible = computed(() => {
    const state = this.store.state();
    return state.kind === 'impossible' ? impossibleWords(state.issue, this.book) : null;
  });
  protected readonly lastChange = computed(() => this.store.saved()?.changes.at(-1) ?? null);

  constructor() {
    effect(() => {
      const analysisId = this.analysisId();
      untracked(() => {
        if (analysisId !== this.store.saved()?.id) {
          this.loader.open(analysisId === 'new' ? null : analysisId);
        }
      });
    });
  }

  /** Asked by the router before it leaves. */
  hasUnsavedWork(): boolean {
    return this.store.mayEdit() && this.keeper.isChanged();
  }

  protected warn(event: BeforeUnloadEvent): void {
    if (this.hasUnsavedWork()) event.preventDefault();
  }

  protected save(): void {
    if (!this.keeper.needsReason()) {
      this.keeper.save(null);
      return;
    }
    void this.askForReason((reason) => {
      this.keeper.save(reason);
    });
  }

  protected keepOwn(): void {
    void this.askForReason((reason) => {
      this.keeper.keepOwn(reason);
    });
  }

  protected remove(): void {
    const number = this.store.saved()?.number ?? '';
    this.confirm
      .ask({
        question: `Delete analysis ${number}?`,
        consequence: 'No report uses it. Its number is not given again.',
        keep: 'Keep it',
        act: 'Delete it',
      })
      .subscribe((acted) => {
        if (acted) this.keeper.remove();
      });
  }

  protected async use(): Promise<void> {
    const analysis = this.store.saved();
    const levelId = this.store.levelId();
    if (analysis === null) return;
    const { UseInReportDialog } = await import('../use-in-report/use-in-report-dialog');
    this.dialogs
      .open(UseInReportDialog, { analysis, levelId, scope: this.store.scope() })
      .subscribe();
  }

  private async askForReason(then: (reason: string) => void): Promise<void> {
    const { ReasonDialog } = await import('./reason-dialog');
    const reports = this.uses().map(({ title }) => title);
    this.dialogs.open<string>(ReasonDialog, reports).subscribe(then);
  }
}
