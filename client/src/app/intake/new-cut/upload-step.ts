import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  output,
  signal,
} from '@angular/core';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { Icon } from '../../ui/marks/icon';
import { ProblemPanel } from '../../ui/status/problem-panel';
import { ProgressGauge } from '../../ui/status/progress-gauge';
import { NewCutStore } from './new-cut-store';
import { ReadingForm } from './reading-form';
import { UploadStore } from './upload-store';
import { GroupedNumberPipe } from '../../ui/grouped-number-pipe';

/** Where the cut goes, and the file that it is made of. */
@Component({
  selector: 'eh-upload-step',
  imports: [GroupedNumberPipe, Field, FieldControl, Icon, ProblemPanel, ProgressGauge, ReadingForm],
  templateUrl: './upload-step.html',
  styleUrl: './upload-step.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class UploadStep {
  readonly settled = output();

  protected readonly store = inject(NewCutStore);
  protected readonly uploads = inject(UploadStore);
  protected readonly isOver = signal(false);
  protected readonly severalFiles = signal(false);
  protected readonly upload = this.uploads.upload;
  protected readonly reached = computed(() => {
    const rows = this.upload()?.rowsRead ?? 0;
    return rows === 0 ? '' : `${rows.toLocaleString('en')} rows`;
  });

  protected aim(event: Event): void {
    const id = (event.target as HTMLSelectElement).value;
    this.store.aim(id === '' ? null : id);
  }

  protected pick(event: Event): void {
    const control = event.target as HTMLInputElement;
    this.take([...(control.files ?? [])]);
    // So that the same file can be picked again after it was mended.
    control.value = '';
  }

  protected hover(event: DragEvent): void {
    event.preventDefault();
    this.isOver.set(true);
  }

  protected drop(event: DragEvent): void {
    event.preventDefault();
    this.isOver.set(false);
    this.take([...(event.dataTransfer?.files ?? [])]);
  }

  private take(files: readonly File[]): void {
    this.severalFiles.set(files.length > 1);
    const [file] = files;
    if (file !== undefined && files.length === 1) this.store.send(file);
  }
}
