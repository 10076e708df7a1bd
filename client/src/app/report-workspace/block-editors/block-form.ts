import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  input,
} from '@angular/core';
import {
  type Block,
  type BlockField,
  fieldValue,
  type PinnedAnalysis,
  withFieldValue,
} from '#shared/report';
import type { TextDocument } from '#shared/report/text';
import { BlockActions } from '../block-actions/block-actions';
import { AnalysisPicker } from '../block-actions/analysis-picker';
import { ReportState } from '../report-store/report-state';
import { kindOf, withAnalysis } from './block-content';
import {
  analysisOptions,
  type FieldOption,
  levelOptions,
  optionKey,
  scopeOptions,
} from './field-options';
import { StudyAnalyses } from './study-analyses';
import { WordsField } from './words-field';

interface ChoiceRow {
  readonly field: BlockField;
  readonly value: string;
  readonly options: readonly FieldOption[];
}

interface ToggleRow {
  readonly field: BlockField;
  readonly on: boolean;
}

type TextField = BlockField & { readonly kind: 'text' };

interface WordsRow {
  readonly field: TextField;
  readonly document: TextDocument | null;
}

/** The form that every kind of block describes by its fields. A change shows at once. */
@Component({
  selector: 'eh-block-form',
  imports: [WordsField],
  templateUrl: './block-form.html',
  styleUrl: './block-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BlockForm {
  private readonly state = inject(ReportState);
  private readonly actions = inject(BlockActions);
  private readonly picker = inject(AnalysisPicker);
  private readonly analyses = inject(StudyAnalyses);

  readonly block = input.required<Block>();
  /** Paths of fields that are edited elsewhere. */
  readonly without = input<readonly string[]>([]);
  /** Whether the first control takes the focus at once. */
  readonly takesFocus = input(false);

  private readonly fields = computed(() =>
    (kindOf(this.block())?.fields ?? []).filter((field) => !this.without().includes(field.path)),
  );
  protected readonly choices = computed(() =>
    this.fields().flatMap((field): readonly ChoiceRow[] => {
      const options = this.optionsOf(field);
      const value = optionKey(fieldValue(this.block().content, field.path));
      return options === null ? [] : [{ field, value, options }];
    }),
  );
  protected readonly toggles = computed(() =>
    this.fields()
      .filter((field) => field.kind === 'toggle')
      .map((field): ToggleRow => {
        return { field, on: fieldValue(this.block().content, field.path) === true };
      }),
  );
  protected readonly words = computed(() =>
    this.fields()
      .filter((field): field is TextField => field.kind === 'text')
      .map((field): WordsRow => {
        const document = fieldValue(this.block().content, field.path) as TextDocument | null;
        return { field, document };
      }),
  );

  constructor() {
    const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    this.analyses.fetch();
    afterNextRender(() => {
      if (this.takesFocus()) host.querySelector<HTMLElement>('select, input, button')?.focus();
    });
  }

  protected choose({ field, options }: ChoiceRow, event: Event): void {
    const key = (event.target as HTMLSelectElement).value;
    const chosen = options.find((option) => option.key === key);
    if (chosen === undefined) return;
    if (field.kind === 'analysis') this.chooseAnalysis(field, key);
    else this.set(field, chosen.value);
  }

  protected has({ options, value }: ChoiceRow): boolean {
    return options.some((option) => option.key === value);
  }

  protected set(field: BlockField, value: unknown): void {
    this.replace(withFieldValue(this.block().content, field.path, value));
  }

  protected toggle({ field, on }: ToggleRow): void {
    this.set(field, !on);
  }

  private chooseAnalysis(field: BlockField, analysisId: string): void {
    this.picker.read(analysisId).subscribe((analysis) => {
      this.state.offer(analysis);
      this.replace(withAnalysis(this.block(), field, analysis));
    });
  }

  private replace(content: unknown): void {
    const { id: blockId, version: baseVersion } = this.block();
    this.actions.make([{ kind: 'replaceContent', blockId, baseVersion, content }]);
  }

  private optionsOf(field: BlockField): readonly FieldOption[] | null {
    switch (field.kind) {
      case 'analysis':
        return analysisOptions(this.analyses.list(), this.pinAt(field.path));
      case 'scope':
        return optionsOfPin(this.pinAt(field.analysisPath), scopeOptions);
      case 'indexLevel':
        return optionsOfPin(this.pinAt(field.analysisPath), levelOptions);
      case 'choice':
        return field.options.map(({ value, label }) => ({ key: optionKey(value), label, value }));
      case 'toggle':
      case 'text':
        return null;
    }
  }

  private pinAt(path: string): PinnedAnalysis | undefined {
    return this.state.pins().get(fieldValue(this.block().content, path) as string);
  }
}

function optionsOfPin(
  pin: PinnedAnalysis | undefined,
  optionsOf: (pin: PinnedAnalysis) => readonly FieldOption[],
): readonly FieldOption[] {
  return pin === undefined ? [] : optionsOf(pin);
}
