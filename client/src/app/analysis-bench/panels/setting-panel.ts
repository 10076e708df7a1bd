import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { keptLevels } from '#shared/analysis';
import type { FactorLevel } from '#shared/code-book';
import { FOURFOLD_TESTS, TREND_TESTS } from '#shared/stats';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { BenchStore } from '../bench/bench-store';
import { type AnalysisDraft, withContrastTest, withTrendTest } from '../draft/analysis-draft';
import { columnById } from '../draft/column-choices';
import { parsedLevel, parsedScore } from './setting-values';

/** What else belongs to the analysis: name, confidence level, adjustment, scores, standing. */
@Component({
  selector: 'eh-setting-panel',
  imports: [Field, FieldControl],
  templateUrl: './setting-panel.html',
  styleUrl: './setting-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SettingPanel {
  protected readonly store = inject(BenchStore);
  protected readonly levelProblem = signal<string | null>(null);
  protected readonly scoreProblems = signal<Readonly<Record<string, string>>>({});

  protected readonly levelPercent = computed(() =>
    String(Number((this.store.draft().level * 100).toPrecision(12))),
  );
  protected readonly levels = computed<readonly FactorLevel[]>(() => {
    const { exposure, restrictions } = this.store.draft();
    const column = columnById(this.store.codeBook(), exposure.columnId);
    return column === null ? [] : keptLevels(column, restrictions);
  });
  protected readonly hasStrata = computed(() => this.store.draft().stratumColumnIds.length > 0);

  protected readonly contrastTests = Object.values(FOURFOLD_TESTS);
  protected readonly trendTests = Object.values(TREND_TESTS);
  protected readonly contrastTest = computed(
    () => this.store.draft().otherMethods?.contrastTest ?? '',
  );
  protected readonly trendTest = computed(
    () => this.store.draft().otherMethods?.trendTest ?? TREND_TESTS.cochranArmitage.id,
  );

  protected changeContrastTest(id: string): void {
    this.store.change((draft) => withContrastTest(draft, id === '' ? undefined : id));
  }

  protected changeTrendTest(id: string): void {
    this.store.change((draft) => withTrendTest(draft, id));
  }

  protected valueOf(event: Event): string {
    return (event.target as HTMLInputElement | HTMLSelectElement).value;
  }

  protected changeLevel(event: Event): void {
    const level = parsedLevel(this.valueOf(event));
    this.levelProblem.set(level.ok ? null : level.issue);
    if (level.ok) this.store.change((draft) => ({ ...draft, level: level.value }));
  }

  protected changeAdjustment(adjustment: AnalysisDraft['adjustment']): void {
    this.store.change((draft) => ({ ...draft, adjustment }));
  }

  protected changeStanding(change: Partial<AnalysisDraft['standing']>): void {
    this.store.change((draft) => ({ ...draft, standing: { ...draft.standing, ...change } }));
  }

  protected scoreOf(levelId: string, at: number): number {
    return this.store.draft().trendScores?.[levelId] ?? at + 1;
  }

  /** The first score that is typed makes all of them the analysis' own. */
  protected changeScore(levelId: string, event: Event): void {
    const score = parsedScore(this.valueOf(event));
    this.scoreProblems.update(({ [levelId]: _before, ...others }) =>
      score.ok ? others : { ...others, [levelId]: score.issue },
    );
    if (!score.ok) return;
    const scores = this.levels().map(({ id }, at) => [id, this.scoreOf(id, at)] as const);
    const trendScores = { ...Object.fromEntries(scores), [levelId]: score.value };
    this.store.change((draft) => ({ ...draft, trendScores }));
  }

  protected countScores(): void {
    this.scoreProblems.set({});
    this.store.change((draft) => ({ ...draft, trendScores: null }));
  }
}
