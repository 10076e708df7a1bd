import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  type Signal,
  signal,
} from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MAT_DIALOG_DATA, MatDialogRef } from '@angular/material/dialog';
import { parseAddress } from '#shared/analysis';
import type { PinnedAnalysis } from '#shared/report';
import type { BoundValueFormat } from '#shared/report/text';
import { AnalysesApi } from '../../server-api/analyses-api';
import { DialogFrame } from '../../ui/dialog/dialog-frame';
import { PHRASEBOOK } from '../../ui/phrasebook';
import type { ProofWords } from '../proof/proof-words';
import { found, listedValues, type ListedValue, MOST_SHOWN } from './value-list';
import type { PickedValue } from './value-picker';

/** What the list of values is made of. */
export interface ValuePickerRequest {
  readonly at: string | null;
  readonly studyId: string;
  readonly pins: Signal<ReadonlyMap<string, PinnedAnalysis>>;
  readonly words: Pick<ProofWords, 'textOf' | 'formatsOf'>;
  /** Fetches an analysis that the report does not show yet. */
  readonly offer: (analysisId: string) => void;
}

/** Every value of one analysis, found by its words. Closes with the value and its format. */
@Component({
  selector: 'eh-value-picker-dialog',
  imports: [DialogFrame],
  templateUrl: './value-picker-dialog.html',
  styleUrl: './value-picker-dialog.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ValuePickerDialog {
  private readonly request = inject<ValuePickerRequest>(MAT_DIALOG_DATA);
  private readonly reference = inject<MatDialogRef<ValuePickerDialog, PickedValue>>(MatDialogRef);
  private readonly phrasebook = inject(PHRASEBOOK);

  protected readonly analyses = toSignal(inject(AnalysesApi).list(this.request.studyId), {
    initialValue: [],
  });
  private readonly chosenAnalysis = signal<string | null>(analysisOf(this.request.at));
  protected readonly search = signal('');
  protected readonly chosenKey = signal<string | null>(this.request.at);
  protected readonly format = signal<BoundValueFormat>('auto');

  protected readonly analysisId = computed(
    () => this.chosenAnalysis() ?? [...this.request.pins().keys()][0] ?? this.analyses()[0]?.id,
  );
  private readonly pin = computed(() => {
    const id = this.analysisId();
    return id === undefined ? undefined : this.request.pins().get(id);
  });
  private readonly all = computed((): readonly ListedValue[] => {
    const pin = this.pin();
    if (pin === undefined) return [];
    return listedValues(pin, this.phrasebook, (address) => this.request.words.textOf(address));
  });
  private readonly matching = computed(() => found(this.all(), this.search()));
  protected readonly shown = computed(() => this.matching().slice(0, MOST_SHOWN));
  protected readonly left = computed(() => this.matching().length - this.shown().length);
  protected readonly waiting = computed(() => this.pin() === undefined);
  protected readonly formats = computed(() => {
    const key = this.chosenKey();
    return key === null ? [] : this.request.words.formatsOf(key);
  });

  protected chooseAnalysis(event: Event): void {
    const id = (event.target as HTMLSelectElement).value;
    this.chosenAnalysis.set(id);
    this.chosenKey.set(null);
    if (!this.request.pins().has(id)) this.request.offer(id);
  }

  protected find(event: Event): void {
    this.search.set((event.target as HTMLInputElement).value);
  }

  protected choose(value: ListedValue): void {
    this.chosenKey.set(value.key);
    this.format.set('auto');
  }

  protected chooseFormat(event: Event): void {
    this.format.set((event.target as HTMLSelectElement).value as BoundValueFormat);
  }

  protected insert(): void {
    const address = this.chosenKey();
    if (address !== null) this.reference.close({ address, format: this.format() });
  }

  /** Enter in the search takes the first value that was found. */
  protected insertFirst(event: Event): void {
    event.preventDefault();
    const key = this.chosenKey() ?? this.shown()[0]?.key;
    if (key !== undefined) this.reference.close({ address: key, format: this.format() });
  }

  protected leave(): void {
    this.reference.close();
  }
}

function analysisOf(key: string | null): string | null {
  const address = key === null ? null : parseAddress(key);
  return address?.ok === true ? address.value.analysisId : null;
}
