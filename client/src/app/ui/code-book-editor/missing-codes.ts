import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  linkedSignal,
  output,
  signal,
} from '@angular/core';
import {
  type CodeBookColumn,
  codeBookEditMessage,
  type EditedColumn,
  FACTOR_SOURCE,
  markMissing,
  unmarkMissing,
} from '#shared/code-book';
import { Icon } from '../marks/icon';
import type { LevelCounts, UnknownCode } from './column-contents';
import { shownCode } from './column-words';
import { GroupedNumberPipe } from '../grouped-number-pipe';

/** The codes of a column that stand for no answer, and what each of them means. */
@Component({
  selector: 'eh-missing-codes',
  imports: [GroupedNumberPipe, Icon],
  templateUrl: './missing-codes.html',
  styleUrl: './missing-codes.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MissingCodes {
  readonly column = input.required<CodeBookColumn>();
  readonly counts = input.required<LevelCounts>();
  readonly unknown = input<readonly UnknownCode[]>([]);
  readonly readOnly = input(false);
  readonly changed = output<CodeBookColumn>();

  protected readonly adding = linkedSignal<string, boolean>({
    source: () => this.column().id,
    computation: () => false,
  });
  protected readonly problem = signal('');
  protected readonly hasLevels = computed(() => FACTOR_SOURCE[this.column().kind] === 'levels');

  protected shown(code: string): string {
    return shownCode(code);
  }

  protected countOf(code: string): number | null {
    return this.counts().ofMissingCode.get(code) ?? null;
  }

  /** A reason that is emptied stays as typed and is refused, so that the field can say so. */
  protected reword(code: string, event: Event): void {
    const reason = (event.target as HTMLInputElement).value;
    const missingCodes = this.column().missingCodes.map((missing) =>
      missing.code === code ? { ...missing, reason } : missing,
    );
    this.changed.emit({ ...this.column(), missingCodes });
  }

  protected makeLevel(code: string): void {
    this.apply(unmarkMissing(this.column(), code));
  }

  /** A value without a meaning becomes missing, then a level: the one way to make a level of it. */
  protected makeUnknownLevel(code: string): void {
    const marked = markMissing(this.column(), code, 'New');
    this.apply(marked.ok ? unmarkMissing(marked.value, code) : marked);
  }

  protected giveReason(code: string, event: Event): void {
    const reason = (event.target as HTMLInputElement).value;
    if (reason.trim() !== '') this.apply(markMissing(this.column(), code, reason));
  }

  protected add(code: string, reason: string): void {
    if (!this.apply(markMissing(this.column(), code, reason))) return;
    this.adding.set(false);
  }

  private apply(outcome: EditedColumn): boolean {
    this.problem.set(outcome.ok ? '' : codeBookEditMessage(outcome.issue));
    if (outcome.ok) this.changed.emit(outcome.value);
    return outcome.ok;
  }
}
