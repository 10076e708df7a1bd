import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import type { ResultScope } from '#shared/analysis';
import type { EffectMeasureId } from '#shared/effects';
import { intervalLabel } from '#shared/format';
import { columnHeads } from '#shared/wording';
import { FramingGlyph } from '../../ui/framing/framing-glyph';
import { BenchStore } from '../bench/bench-store';
import { contrastLabel, levelLabel, scopeLabel } from '../bench/result-scopes';
import { withMethod, withPooling } from '../draft/analysis-draft';
import { shownMeasures } from '../print/bench-print';
import { type AnswerState, ComputedAnswers } from '../computing/computed-answers';
import { type MethodQuestion, questionKey } from '../methods/method-question';
import type { MethodGroup, MethodRow } from '../methods/method-group';
import { measureGroups, poolingGroups, riskGroup } from '../methods/method-groups';

/** The interval methods side by side, drawn on one axis; the chosen one holds for all strata. */
@Component({
  selector: 'eh-methods-panel',
  imports: [FramingGlyph],
  templateUrl: './methods-panel.html',
  styleUrl: './methods-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MethodsPanel {
  protected readonly store = inject(BenchStore);
  private readonly answers = inject(ComputedAnswers);

  protected readonly scope = computed<ResultScope>(() => this.store.scope());
  protected readonly isPooled = computed(() => this.scope().kind === 'pooled');
  protected readonly groups = computed<readonly MethodGroup[]>(() => {
    const print = this.store.print();
    if (print === null) return [];
    const [scope, levelId] = [this.scope(), this.store.levelId()];
    const measures = shownMeasures(print.result);
    if (this.isPooled()) return poolingGroups(print, measures, levelId);
    const risk =
      print.result.frame.design === 'caseControl' ? null : riskGroup(print, scope, levelId);
    const groups = measureGroups(print, measures, { scope, levelId }, (question) => {
      const state = this.stateOf(question);
      return state?.kind === 'computed' ? state.answer : null;
    });
    return [...groups, ...(risk === null ? [] : [risk])];
  });
  protected readonly about = computed(() => {
    const print = this.store.print();
    if (print === null) return '';
    const { result, style } = print;
    const layer = scopeLabel(result, this.scope());
    const interval = intervalLabel(result.specification.level, style);
    return `${layer}, ${contrastLabel(result, this.store.levelId())}, ${interval}`;
  });
  private readonly heads = computed(() => {
    const print = this.store.print();
    if (print === null) return null;
    return columnHeads({ analysisId: '', result: print.result }, print.style, print.book);
  });

  protected headOf(group: MethodGroup): string {
    const heads = this.heads();
    if (heads === null) return '';
    if (group.estimand === 'risk') {
      const result = this.store.result();
      return `${heads.share}, ${result === null ? '' : levelLabel(result, this.store.levelId())}`;
    }
    const head = heads[group.estimand satisfies EffectMeasureId];
    return group.scale === 'ratio' ? `${head}, log scale` : head;
  }

  protected tickWords(group: MethodGroup, value: number): string {
    const number = String(Number(value.toPrecision(4))).replace('-', '\u2212');
    return group.scale === 'ratio' ? `${number}×` : number;
  }

  protected choose(group: MethodGroup, methodId: string): void {
    const { estimand } = group;
    this.store.change((draft) =>
      this.isPooled() && estimand !== 'risk'
        ? withPooling(draft, estimand, methodId)
        : withMethod(draft, estimand, methodId),
    );
  }

  protected progressOf({ question }: MethodRow): AnswerState<'method'>['kind'] | 'open' {
    return (question && this.stateOf(question)?.kind) ?? 'open';
  }

  protected compute({ question }: MethodRow): void {
    if (question === null) return;
    this.answers.want<'method'>(questionKey(question), { kind: 'method', question });
  }

  private stateOf(question: MethodQuestion): AnswerState<'method'> | undefined {
    return this.answers.stateOf<'method'>(questionKey(question));
  }
}
