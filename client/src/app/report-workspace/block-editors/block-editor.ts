import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  effect,
  ElementRef,
  inject,
  input,
  output,
  viewChild,
} from '@angular/core';
import type { LayoutElement } from '#shared/layout';
import type { Block } from '#shared/report';
import type { TextDocument } from '#shared/report/text';
import { ProofElement, ProofFigure } from '../../ui/proof/proof-element';
import { ProofChart } from '../figures/proof-chart';
import { ProofWords } from '../proof/proof-words';
import { TextEditor } from '../text-editor/text-editor';
import { kindOf, textOf } from './block-content';
import { BlockForm } from './block-form';
import { companionOf } from './companions';
import { TextEditSession } from './text-edit-session';

/**
 * A block while it is open: its text in place, and a form for what else its kind describes. What
 * the block prints stays in view, so that every choice shows at once.
 */
@Component({
  selector: 'eh-block-editor',
  imports: [BlockForm, ProofChart, ProofElement, ProofFigure, TextEditor],
  templateUrl: './block-editor.html',
  styleUrl: './block-editor.scss',
  host: { '(keydown.escape)': 'leave($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BlockEditor {
  private readonly session = inject(TextEditSession);
  protected readonly words = inject(ProofWords);

  readonly block = input.required<Block>();
  readonly elements = input.required<readonly LayoutElement[]>();
  readonly left = output();

  private readonly editor = viewChild(TextEditor);
  protected readonly text = computed(() => textOf(this.block()));
  protected readonly elsewhere = computed(() => [
    ...(this.text() === null ? [] : [this.text()?.path ?? '']),
    ...(companionOf(this.block().kind)?.handles ?? []),
  ]);
  protected readonly hasForm = computed(() =>
    (kindOf(this.block())?.fields ?? []).some(({ path }) => !this.elsewhere().includes(path)),
  );
  /** A heading is written in its own type. */
  protected readonly type = computed(() => {
    const [first] = this.elements();
    return first?.kind === 'heading' ? `heading-${first.level}` : 'body';
  });

  constructor() {
    effect(() => {
      const editor = this.editor();
      if (editor !== undefined) this.session.begin(this.block().id, editor);
    });
    inject(DestroyRef).onDestroy(() => {
      this.session.end();
    });
    const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    afterNextRender(() => {
      // The cursor goes into the words; where there are none, the form takes the focus.
      if (this.text() === null) host.querySelector<HTMLElement>('select, input')?.focus();
    });
  }

  protected changed(document: TextDocument): void {
    this.session.changed(this.block().id, document);
  }

  protected leave(event: Event): void {
    if (event.defaultPrevented) return;
    event.preventDefault();
    this.left.emit();
  }
}
