import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatMenuModule } from '@angular/material/menu';
import type { BoundValueFormat } from '#shared/report/text';
import { ProofWords } from '../proof/proof-words';
import { ValuePicker } from '../value-picker/value-picker';
import { LinkForm } from './link-form';
import { RovingFocus } from './roving-focus';
import {
  changeAtom,
  insertAtom,
  isOn,
  linkAt,
  setLink,
  TEXT_COMMANDS,
  type TextCommandId,
} from './text-commands';
import type { TextSession } from './text-session';
import type { TextShape } from './text-shape';

interface TextButton {
  readonly id: TextCommandId;
  readonly sign: string;
  readonly says: string;
  readonly shapes: readonly TextShape[];
}

const STYLES: readonly TextButton[] = [
  { id: 'strong', sign: 'B', says: 'Bold (Ctrl B)', shapes: ['one', 'many'] },
  { id: 'em', sign: 'I', says: 'Italic (Ctrl I)', shapes: ['one', 'many'] },
  { id: 'superscript', sign: 'x²', says: 'Superscript (Ctrl .)', shapes: ['one', 'many'] },
  { id: 'subscript', sign: 'x₂', says: 'Subscript (Ctrl ,)', shapes: ['one', 'many'] },
  { id: 'bulletList', sign: '•', says: 'Bulleted list', shapes: ['many'] },
  { id: 'orderedList', sign: '1.', says: 'Numbered list', shapes: ['many'] },
];

/** What can be done with the words under the cursor. */
@Component({
  selector: 'eh-text-toolbar',
  imports: [LinkForm, MatMenuModule, RovingFocus],
  templateUrl: './text-toolbar.html',
  styleUrl: './text-toolbar.scss',
  host: { '(mousedown)': 'keepSelection($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TextToolbar {
  private readonly picker = inject(ValuePicker);
  protected readonly proof = inject(ProofWords);

  readonly session = input.required<TextSession>();
  readonly moves = input.required<number>();
  readonly shape = input.required<TextShape>();
  readonly place = input.required<string>();

  protected readonly linking = signal(false);
  protected readonly buttons = computed(() =>
    STYLES.filter((button) => button.shapes.includes(this.shape())),
  );
  private readonly state = computed(() => {
    this.moves();
    return this.session().view.state;
  });
  protected readonly on = computed(() => {
    const state = this.state();
    return new Set(this.buttons().flatMap(({ id }) => (isOn(state, id) ? [id] : [])));
  });
  protected readonly link = computed(() => linkAt(this.state()));
  protected readonly hasSelection = computed(() => !this.state().selection.empty);
  protected readonly value = computed(() => {
    this.moves();
    const atom = this.session().selectedAtom;
    return atom?.type === 'boundValue'
      ? (atom.attrs as { readonly address: string; readonly format: BoundValueFormat })
      : null;
  });
  protected readonly formats = computed(() => {
    const value = this.value();
    return value === null ? [] : this.proof.formatsOf(value.address);
  });

  protected press(id: TextCommandId): void {
    this.session().run(TEXT_COMMANDS[id]);
  }

  protected insertValue(): void {
    this.picker.pick(this.value()?.address ?? null).subscribe((picked) => {
      this.session().run(insertAtom('boundValue', { ...picked }));
    });
  }

  protected print(event: Event): void {
    const format = (event.target as HTMLSelectElement).value;
    this.session().run(changeAtom({ format }));
  }

  protected refer(blockId: string): void {
    this.session().run(insertAtom('crossReference', { blockId }));
  }

  protected setLink(href: string | null): void {
    this.linking.set(false);
    if (href !== null) this.session().run(setLink(href));
    else this.session().view.focus();
  }

  /** A press of a button leaves the selection in the text as it is. */
  protected keepSelection(event: MouseEvent): void {
    if ((event.target as Element).closest('input, select') === null) event.preventDefault();
  }
}
