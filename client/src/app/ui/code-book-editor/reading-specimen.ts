import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { CodeBookColumn } from '#shared/code-book';
import { Field } from '../field/field';
import { FieldControl } from '../field/field-control';
import {
  filledPattern,
  GROUP_PATTERNS,
  patternProblem,
  shownLevels,
  WITHIN_PATTERNS,
} from './spoken-patterns';

/** How a column's levels will read in sentences: as groups that are compared, and as strata. */
@Component({
  selector: 'eh-reading-specimen',
  imports: [Field, FieldControl],
  templateUrl: './reading-specimen.html',
  styleUrl: './reading-specimen.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReadingSpecimen {
  readonly column = input.required<CodeBookColumn>();
  readonly peopleNoun = input('people');
  readonly readOnly = input(false);
  readonly changed = output<CodeBookColumn>();

  protected readonly groupPatterns = GROUP_PATTERNS;
  protected readonly withinPatterns = WITHIN_PATTERNS;
  protected readonly groupProblem = computed(() => patternProblem(this.column().groupPattern));
  protected readonly withinProblem = computed(() => patternProblem(this.column().withinPattern));
  protected readonly groups = computed(() =>
    shownLevels(this.column()).map((level) => this.groupWords(level)),
  );
  protected readonly strata = computed(() =>
    shownLevels(this.column()).map((level) => this.withinWords(level)),
  );

  protected setGroup(event: Event): void {
    this.changed.emit({ ...this.column(), groupPattern: textOf(event) });
  }

  protected setWithin(event: Event): void {
    this.changed.emit({ ...this.column(), withinPattern: textOf(event) });
  }

  private groupWords(level: string): string {
    const { groupPattern, sentenceLabel } = this.column();
    const own = groupPattern?.includes('{level}') === true ? groupPattern : null;
    const pattern = own ?? `{people} with ${sentenceLabel} {level}`;
    return filledPattern(pattern, level, this.peopleNoun());
  }

  private withinWords(level: string): string {
    const { withinPattern, sentenceLabel } = this.column();
    const own = withinPattern?.includes('{level}') === true ? withinPattern : null;
    return filledPattern(own ?? `within ${sentenceLabel} {level}`, level, this.peopleNoun());
  }
}

function textOf(event: Event): string | null {
  const text = (event.target as HTMLInputElement).value;
  return text.trim() === '' ? null : text;
}
