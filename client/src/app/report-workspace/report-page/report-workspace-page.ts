import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  inject,
  input,
  type OnInit,
  signal,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { addressKey } from '#shared/analysis';
import { ApiProblem } from '../../server-api/api-problem';
import { CurrentStudy } from '../../session/current-study';
import { Bar, BarActions, BarBeside } from '../../ui/bar/bar';
import { FramingRail } from '../../ui/framing/framing-rail';
import { PROOF_SOURCES, type ProofSources } from '../../ui/proof/proof-sources';
import { ProblemPanel } from '../../ui/status/problem-panel';
import { StageStamp } from '../../ui/status/stage-stamp';
import { TextEditSession } from '../block-editors/text-edit-session';
import { ProofDesk } from '../proof/proof-desk';
import { ProofSheet } from '../proof/proof-sheet';
import { warmFramings } from '../proof/warm-framings';
import { ReportProof } from '../proof/report-proof';
import { DraftRecovery } from '../report-store/draft-recovery';
import { ReportState } from '../report-store/report-state';
import { ReportStore } from '../report-store/report-store';
import { SaveState } from '../report-store/save-state';
import { CheckMeter } from './check-meter';
import { DownloadMenu } from './download-menu';
import { leavingWarning } from './leaving-warning';
import { PhoneDock } from './phone-dock';
import { RefusedSteps } from './refused-steps';
import { ReportFraming } from './report-framing';
import { SaveMark } from './save-mark';
import { workspaceKeys } from './workspace-keys';
import { WORKSPACE_PROVIDERS } from './workspace-providers';

/** One report: the proof with its margins, and in the bar what concerns it as a whole. */
@Component({
  selector: 'eh-report-workspace-page',
  imports: [
    Bar,
    BarActions,
    BarBeside,
    CheckMeter,
    DownloadMenu,
    FramingRail,
    PhoneDock,
    ProblemPanel,
    ProofSheet,
    RefusedSteps,
    SaveMark,
    StageStamp,
  ],
  templateUrl: './report-workspace-page.html',
  styleUrl: './report-workspace-page.scss',
  providers: [...WORKSPACE_PROVIDERS, { provide: PROOF_SOURCES, useFactory: proofSources }],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReportWorkspacePage implements OnInit {
  private readonly store = inject(ReportStore);
  private readonly recovery = inject(DraftRecovery);
  private readonly session = inject(TextEditSession);
  private readonly saveState = inject(SaveState);
  private readonly study = inject(CurrentStudy);
  private readonly destroyed = inject(DestroyRef);
  protected readonly desk = inject(ProofDesk);
  protected readonly framing = inject(ReportFraming);

  readonly studyId = input.required<string>();
  readonly reportId = input.required<string>();

  protected readonly report = this.store.report;
  protected readonly problem = signal<ApiProblem | null>(null);
  protected readonly studyTitle = computed(() => this.study.study()?.title ?? '');
  protected readonly title = computed(() => this.report()?.title ?? 'Report');
  protected readonly differing = computed(() => this.framing.differing().length);

  constructor() {
    workspaceKeys();
    warmFramings();
    leavingWarning();
  }

  ngOnInit(): void {
    this.store
      .open({ studyId: this.studyId(), reportId: this.reportId() })
      .pipe(takeUntilDestroyed(this.destroyed))
      .subscribe({
        next: () => {
          this.recovery.putBack();
        },
        error: (failure: unknown) => {
          this.problem.set(ApiProblem.from(failure));
        },
      });
  }

  /** Asked by the router before the page is left. */
  readyToLeave(): boolean {
    this.session.commit();
    return !this.saveState.unsent();
  }
}

/** Ties the chips of the proof to the margins. */
function proofSources(): ProofSources {
  const state = inject(ReportState);
  const proof = inject(ReportProof);
  const desk = inject(ProofDesk);
  const litKeys = computed(() => {
    const blockId = desk.litBlockId();
    const bound = blockId === null ? [] : proof.of(blockId).bound;
    return new Set(bound.map(({ address }) => addressKey(address)));
  });
  return {
    nameOf: (analysisId) => state.pins().get(analysisId)?.number ?? null,
    spotlight: desk.spotlight,
    isLit: (address) => litKeys().size > 0 && litKeys().has(addressKey(address)),
  };
}
