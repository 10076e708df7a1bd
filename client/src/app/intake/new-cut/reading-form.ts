import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  linkedSignal,
  output,
} from '@angular/core';
import type { CutProfile, ReadingOptions } from '#shared/api';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';

const DELIMITERS = [
  { value: ',', name: 'Comma' },
  { value: ';', name: 'Semicolon' },
  { value: '\t', name: 'Tab' },
  { value: '|', name: 'Bar |' },
  { value: ' ', name: 'Space' },
] as const;

/** How the file was read, and how to read it otherwise. */
@Component({
  selector: 'eh-reading-form',
  imports: [Field, FieldControl],
  templateUrl: './reading-form.html',
  styleUrl: './reading-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReadingForm {
  readonly profile = input.required<CutProfile>();
  readonly again = output<ReadingOptions>();

  protected readonly options = linkedSignal(() => this.profile().usedOptions);
  protected readonly isText = computed(() => this.profile().sheets.length === 0);
  protected readonly isChanged = computed(
    () => JSON.stringify(this.options()) !== JSON.stringify(this.profile().usedOptions),
  );
  protected readonly delimiters = computed(() => {
    const used = this.profile().usedOptions.delimiter;
    const isKnown = used === null || DELIMITERS.some(({ value }) => value === used);
    return isKnown ? DELIMITERS : [...DELIMITERS, { value: used, name: used }];
  });

  protected change(change: Partial<ReadingOptions>): void {
    this.options.update((options) => ({ ...options, ...change }));
  }

  protected valueOf(event: Event): string {
    return (event.target as HTMLSelectElement).value;
  }

  protected encodingOf(event: Event): ReadingOptions['encoding'] {
    return this.valueOf(event) === 'windows-1252' ? 'windows-1252' : 'utf-8';
  }

  protected markOf(event: Event): ReadingOptions['decimalMark'] {
    return this.valueOf(event) === ',' ? ',' : '.';
  }
}
