import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  output,
  signal,
} from '@angular/core';
import type { BlockField } from '#shared/report';
import { isEmptyDocument, plainDocument, type TextDocument } from '#shared/report/text';
import { ProofWords } from '../proof/proof-words';
import { TextEditor } from '../text-editor/text-editor';

/**
 * Words of a block that may be a person's own or made: a title, the words before a sentence. They
 * are stored when the person leaves them.
 */
@Component({
  selector: 'eh-words-field',
  imports: [TextEditor],
  template: `
    <div class="top">
      <span class="label">{{ field().label }}</span>
      @if (own()) {
        <button type="button" class="text-button" (click)="giveBack()">Leave it out</button>
      } @else {
        <button type="button" class="text-button" (click)="begin()">Write your own</button>
      }
    </div>
    @if (own()) {
      <div class="box" (focusout)="store($event)">
        <eh-text-editor
          shape="one"
          [blockId]="blockId()"
          [document]="shown()"
          [name]="field().label"
          [placeholder]="field().hint"
          [words]="words.atoms()"
          [takesFocus]="writing() !== null"
          (changed)="writing.set($event)"
          (left)="storeNow()"
        />
      </div>
    } @else {
      <p>{{ field().hint }}</p>
    }
  `,
  styleUrl: './words-field.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WordsField {
  protected readonly words = inject(ProofWords);

  readonly blockId = input.required<string>();
  readonly field = input.required<BlockField & { readonly kind: 'text' }>();
  readonly document = input.required<TextDocument | null>();
  readonly changed = output<TextDocument | null>();

  /** What is being written; null while nothing is. */
  protected readonly writing = signal<TextDocument | null>(null);
  protected readonly own = computed(() => this.document() !== null || this.writing() !== null);
  private readonly started = signal<TextDocument | null>(null);
  protected readonly shown = computed(() => this.document() ?? this.started() ?? plainDocument(''));

  /** A title of one's own begins with the one that was made. */
  protected begin(): void {
    const made = this.words.references().find(({ blockId }) => blockId === this.blockId());
    const start = plainDocument(made?.title ?? '');
    this.started.set(start);
    this.writing.set(start);
  }

  protected giveBack(): void {
    this.writing.set(null);
    this.changed.emit(null);
  }

  protected store(event: FocusEvent): void {
    const inside = (event.currentTarget as Element).contains(event.relatedTarget as Node | null);
    if (!inside) this.storeNow();
  }

  protected storeNow(): void {
    const document = this.writing();
    if (document === null) return;
    this.writing.set(null);
    this.changed.emit(isEmptyDocument(document) ? null : document);
  }
}
