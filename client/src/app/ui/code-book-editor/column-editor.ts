import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import {
  changeKind,
  type CodeBookColumn,
  type CodeBookFinding,
  COLUMN_KINDS,
  type ColumnKind,
  type ColumnWords,
  COUNTED_OUTCOME_COLUMN_ID,
  type DecimalMark,
  FACTOR_SOURCE,
  type ProfiledColumn,
  renameColumn,
} from '#shared/code-book';
import { Field } from '../field/field';
import { FieldControl } from '../field/field-control';
import { Icon } from '../marks/icon';
import { BandEditor } from './band-editor';
import { levelCounts, unknownCodes } from './column-contents';
import { COLUMN_KIND_HELP, COLUMN_KIND_WORDS } from './column-words';
import { LevelList } from './level-list';
import { MissingCodes } from './missing-codes';
import { ReadingSpecimen } from './reading-specimen';

/** One column of the code book: its words, kind, levels or bands, and missing codes. */
@Component({
  selector: 'eh-column-editor',
  imports: [BandEditor, Field, FieldControl, Icon, LevelList, MissingCodes, ReadingSpecimen],
  templateUrl: './column-editor.html',
  styleUrl: './column-editor.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ColumnEditor {
  readonly column = input.required<CodeBookColumn>();
  readonly contents = input<ProfiledColumn | null>(null);
  readonly findings = input<readonly CodeBookFinding[]>([]);
  readonly decimalMark = input<DecimalMark>('.');
  readonly countNoun = input('rows');
  readonly peopleNoun = input('people');
  readonly readOnly = input(false);
  readonly changed = output<CodeBookColumn>();

  protected readonly kinds = COLUMN_KINDS;
  protected readonly kindWords = COLUMN_KIND_WORDS;
  protected readonly help = computed(() => COLUMN_KIND_HELP[this.column().kind]);
  protected readonly source = computed(() => FACTOR_SOURCE[this.column().kind]);
  /** The outcome of two count columns has no values of its own. */
  protected readonly isCounted = computed(() => this.column().id === COUNTED_OUTCOME_COLUMN_ID);
  /** A column by which the rows are counted stays a count; the layout decides that. */
  protected readonly kindIsFixed = computed(
    () => this.readOnly() || this.isCounted() || this.column().kind === 'count',
  );
  protected readonly counts = computed(() =>
    levelCounts(this.column(), this.contents(), this.decimalMark()),
  );
  protected readonly unknown = computed(() => unknownCodes(this.column(), this.contents()));
  protected readonly hasParts = computed(() => {
    const { levels, bands } = this.column();
    return this.source() === 'bands' ? bands.length > 0 : levels.length > 0;
  });

  protected reword(words: ColumnWords): void {
    this.changed.emit(renameColumn(this.column(), words));
  }

  protected rewordUnit(event: Event): void {
    const unit = this.valueOf(event);
    this.reword({ unit: unit.trim() === '' ? null : unit });
  }

  protected rekind(event: Event): void {
    const kind = this.valueOf(event) as ColumnKind;
    this.changed.emit(changeKind(this.column(), kind, this.contents()));
  }

  protected valueOf(event: Event): string {
    return (event.target as HTMLInputElement | HTMLSelectElement).value;
  }
}
