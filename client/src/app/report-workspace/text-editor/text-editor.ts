import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  DestroyRef,
  effect,
  type ElementRef,
  inject,
  input,
  output,
  signal,
  untracked,
  viewChild,
  ViewEncapsulation,
} from '@angular/core';
import type { Command } from 'prosemirror-state';
import type { TextDocument } from '#shared/report/text';
import type { AtomWords } from './atom-words';
import { TextSession } from './text-session';
import type { TextShape } from './text-shape';
import { TextToolbar } from './text-toolbar';

/**
 * Words while they are written. Loaded when a person begins to write, as the editor is large.
 *
 * `changed` gives the text at every change; `steps` holds what was done since `settle`.
 * Values and cross-references stand in the text as chips that cannot be typed into.
 */
@Component({
  selector: 'eh-text-editor',
  imports: [TextToolbar],
  template: `
    @if (session(); as open) {
      <eh-text-toolbar [session]="open" [moves]="moves()" [shape]="shape()" [place]="blockId()" />
    }
    <div #place class="text-place" [attr.data-empty]="empty() ? placeholder() : null"></div>
  `,
  styleUrl: './text-editor.scss',
  encapsulation: ViewEncapsulation.None,
  host: { class: 'eh-text-editor' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TextEditor {
  readonly document = input.required<TextDocument>();
  readonly shape = input<TextShape>('many');
  /** What the text is, for whoever cannot see it: "Prose", "Title of Table 2". */
  readonly name = input.required<string>();
  readonly placeholder = input('');
  readonly words = input.required<AtomWords>();
  /** The block that the text belongs to. */
  readonly blockId = input.required<string>();
  /** Whether the cursor goes into the text at once. */
  readonly takesFocus = input(true);

  readonly changed = output<TextDocument>();
  /** The person has left with Esc or Ctrl Enter. */
  readonly left = output();

  protected readonly session = signal<TextSession | null>(null);
  /** Counts every change of text or selection, for what depends on the place of the cursor. */
  protected readonly moves = signal(0);
  protected readonly empty = signal(false);
  private readonly place = viewChild.required<ElementRef<HTMLElement>>('place');

  constructor() {
    inject(DestroyRef).onDestroy(() => this.session()?.end());
    afterNextRender(() => {
      this.begin();
    });
    effect(() => {
      const document = this.document();
      untracked(() => {
        const open = this.session();
        if (open?.steps.length === 0) open.show(document);
      });
    });
    effect(() => {
      this.words();
      untracked(() => this.session()?.refreshAtoms());
    });
  }

  get steps(): readonly unknown[] {
    return this.session()?.steps ?? [];
  }

  settle(): void {
    this.session()?.settle();
  }

  private begin(): void {
    const session = new TextSession({
      place: this.place().nativeElement,
      document: this.document(),
      shape: this.shape(),
      name: this.name(),
      words: () => untracked(this.words),
      keys: { Escape: this.leave, 'Mod-Enter': this.leave },
      moved: (change) => {
        this.takeMove(change);
      },
    });
    this.session.set(session);
    this.empty.set(isEmpty(session));
    if (this.takesFocus()) session.focusEnd();
  }

  private readonly leave: Command = () => {
    this.left.emit();
    return true;
  };

  private takeMove(change: 'text' | 'selection'): void {
    const session = this.session();
    if (session === null) return;
    this.moves.update((count) => count + 1);
    this.empty.set(isEmpty(session));
    if (change === 'text') this.changed.emit(session.document);
  }
}

function isEmpty({ view }: TextSession): boolean {
  const { doc } = view.state;
  return doc.childCount === 1 && doc.content.size === 2;
}
