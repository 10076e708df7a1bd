import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import type { CodeBookColumn } from '#shared/code-book';
import { fillWords } from '#shared/wording';
import { Field } from '../field/field';
import { FieldControl } from '../field/field-control';
import { PHRASEBOOK } from '../phrasebook';
import {
  filledPattern,
  GROUP_PATTERNS,
  patternProblem,
  shownLevels,
  usablePattern,
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

  private readonly book = inject(PHRASEBOOK);
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

  /** What is said where the code book says nothing. */
  protected readonly usualGroup = computed(() =>
    fillWords(this.book, 'group.default', {
      people: '{people}',
      exposure: this.column().sentenceLabel,
      level: '{level}',
    }),
  );
  protected readonly usualWithin = computed(() =>
    fillWords(this.book, 'within.default', {
      column: this.column().sentenceLabel,
      level: '{level}',
    }),
  );

  private groupWords(level: string): string {
    const own = usablePattern(this.column().groupPattern);
    return filledPattern(own ?? this.usualGroup(), level, this.peopleNoun());
  }

  private withinWords(level: string): string {
    const own = usablePattern(this.column().withinPattern);
    return filledPattern(own ?? this.usualWithin(), level, this.peopleNoun());
  }
}

function textOf(event: Event): string | null {
  const text = (event.target as HTMLInputElement).value;
  return text.trim() === '' ? null : text;
}
