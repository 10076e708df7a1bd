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
  bandColumn,
  type CodeBookColumn,
  codeBookEditMessage,
  cutPointsOf,
  type DecimalMark,
  type ProfiledColumn,
  removeBands,
} from '#shared/code-book';
import { Field } from '../field/field';
import { FieldControl } from '../field/field-control';
import { grainOf, parsedCutPoints } from './cut-points';

/** Bands a column of numbers at cut points. */
@Component({
  selector: 'eh-band-editor',
  imports: [Field, FieldControl],
  template: `
    <eh-field label="Cut points" [help]="help()" [problem]="problem()">
      <input
        ehControl
        class="input"
        placeholder="40, 60, 75"
        [readOnly]="readOnly()"
        [value]="text()"
        (input)="text.set($any($event.target).value)"
        (change)="band()"
        (keydown.enter)="band()"
      />
    </eh-field>
    @if (!readOnly()) {
      <button type="button" class="button" (click)="band()">Band it</button>
      @if (column().bands.length > 0) {
        <button type="button" class="button quiet" (click)="unband()">Remove the bands</button>
      }
    }
  `,
  styleUrl: './band-editor.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BandEditor {
  readonly column = input.required<CodeBookColumn>();
  readonly contents = input<ProfiledColumn | null>(null);
  readonly decimalMark = input<DecimalMark>('.');
  readonly readOnly = input(false);
  readonly changed = output<CodeBookColumn>();

  private readonly points = computed(() => cutPointsOf(this.column()).join(', '));
  protected readonly text = linkedSignal(() => this.points());
  protected readonly problem = signal<string | null>(null);
  protected readonly help = computed(() => {
    const range = rangeOf(this.contents());
    return `A cut point belongs to the band above it.${range}`;
  });

  protected band(): void {
    const points = parsedCutPoints(this.text());
    if (!points.ok) {
      this.problem.set(points.issue);
      return;
    }
    const grain = grainOf(this.contents(), this.decimalMark());
    const banded = bandColumn(this.column(), points.value, grain);
    this.problem.set(banded.ok ? null : codeBookEditMessage(banded.issue));
    if (banded.ok) this.changed.emit(banded.value);
  }

  protected unband(): void {
    this.problem.set(null);
    this.changed.emit(removeBands(this.column()));
  }
}

function rangeOf(contents: ProfiledColumn | null): string {
  const [minimum, maximum] = [contents?.minimum ?? null, contents?.maximum ?? null];
  if (minimum === null || maximum === null) return '';
  return ` The numbers run from ${minimum} to ${maximum}.`;
}
