import { computed, Injectable, signal } from '@angular/core';
import type { DraftView, ReportView } from '#shared/api';
import type { HouseStyle } from '#shared/house-style';
import type { PinnedAnalysis, Report, ReportStage } from '#shared/report';
import { openSharedReport, type SharedReport } from './shared-report';

/** Where a report is found. */
export interface ReportPlace {
  readonly studyId: string;
  readonly reportId: string;
}

/** What this page knows about the open report. Others change it through the store and the sync. */
@Injectable()
export class ReportState {
  readonly place = signal<ReportPlace | null>(null);
  readonly shared = signal<SharedReport | null>(null);
  /** Drafts that the server kept of texts that this person was writing. */
  readonly drafts = signal<readonly DraftView[]>([]);
  readonly lastSavedAt = signal<string | null>(null);

  private readonly knownResults = signal<ReadonlyMap<string, PinnedAnalysis>>(new Map());
  private readonly offered = signal<ReadonlyMap<string, PinnedAnalysis>>(new Map());
  private readonly knownStyles = signal<ReadonlyMap<string, HouseStyle>>(new Map());

  /** The report as this person sees it. */
  readonly report = computed(() => this.shared()?.local.report ?? null);
  /** Whether the report's stage lets anybody change it. */
  readonly isOpen = computed(() => {
    const report = this.report();
    return report !== null && OPEN_STAGES.includes(report.stage);
  });
  readonly pending = computed(() => this.shared()?.pending ?? []);
  readonly conflicts = computed(() => this.shared()?.conflicts ?? []);
  readonly houseStyle = computed(() => this.styleOf(this.report()));
  /** Analyses by id, each with the result that is shown now. */
  readonly pins = computed(() => this.pinsOf(this.report()), { equal: hasSameEntries });
  /** Whether the report pins a result, or names a house style, that this page has not got yet. */
  readonly lacksSources = computed(() => this.lacks(this.report()));

  open(place: ReportPlace, view: ReportView): void {
    this.place.set(place);
    this.shared.set(openSharedReport(view.report));
    this.drafts.set(view.drafts);
    this.takeSources(view);
  }

  /** Takes the results and the house style of an answer, and leaves the report itself alone. */
  takeSources(view: Pick<ReportView, 'pins' | 'houseStyle'>): void {
    this.knownResults.update((known) => extended(known, view.pins, (pin) => pin.resultId));
    this.takeStyles([view.houseStyle]);
  }

  /** Takes one result that the report is about to show. */
  takeResult(pin: PinnedAnalysis): void {
    this.knownResults.update((known) => extended(known, [pin], (each) => each.resultId));
  }

  takeStyles(styles: readonly HouseStyle[]): void {
    this.knownStyles.update((known) => extended(known, styles, (style) => style.id));
  }

  /** Lets a block show an analysis before the server has pinned it. */
  offer(analysis: PinnedAnalysis): void {
    this.offered.update((known) => extended(known, [analysis], (pin) => pin.analysisId));
  }

  private styleOf(report: Report | null): HouseStyle | null {
    const styles = this.knownStyles();
    const wanted = report === null ? undefined : styles.get(report.houseStyleId);
    return wanted ?? [...styles.values()][0] ?? null;
  }

  /** A result that is still on its way leaves the one before in its place. */
  private pinsOf(report: Report | null): ReadonlyMap<string, PinnedAnalysis> {
    const results = this.knownResults();
    const pinned = Object.entries(report?.pins ?? {}).flatMap(([analysisId, resultId]) => {
      const pin = results.get(resultId) ?? latestOf(analysisId, results);
      return pin === undefined ? [] : [[analysisId, pin] as const];
    });
    return new Map([...this.offered(), ...pinned]);
  }

  private lacks(report: Report | null): boolean {
    if (report === null) return false;
    const results = this.knownResults();
    return (
      Object.values(report.pins).some((resultId) => !results.has(resultId)) ||
      !this.knownStyles().has(report.houseStyleId)
    );
  }
}

const OPEN_STAGES: readonly ReportStage[] = ['drafting', 'inReview'];

/** Most steps leave the pins as they are; what is made of all their values is not made anew. */
function hasSameEntries<Value>(
  one: ReadonlyMap<string, Value>,
  other: ReadonlyMap<string, Value>,
): boolean {
  return one.size === other.size && [...one].every(([key, value]) => other.get(key) === value);
}

function latestOf(
  analysisId: string,
  results: ReadonlyMap<string, PinnedAnalysis>,
): PinnedAnalysis | undefined {
  return [...results.values()].findLast((pin) => pin.analysisId === analysisId);
}

function extended<Value>(
  known: ReadonlyMap<string, Value>,
  values: readonly Value[],
  keyOf: (value: Value) => string,
): ReadonlyMap<string, Value> {
  const fresh = values.filter((value) => !known.has(keyOf(value)));
  if (fresh.length === 0) return known;
  return new Map([...known, ...fresh.map((value) => [keyOf(value), value] as const)]);
}
