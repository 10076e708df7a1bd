import {
  ChangeDetectionStrategy,
  Component,
  computed,
  contentChild,
  DestroyRef,
  Directive,
  effect,
  inject,
  input,
  type OnInit,
  TemplateRef,
} from '@angular/core';
import { Title } from '@angular/platform-browser';
import { type BarContent, PageBar } from './page-bar';

/** Marks what stands beside the title: a stamp, a cut. */
@Directive({ selector: 'ng-template[ehBarBeside]' })
export class BarBeside {
  readonly template = inject<TemplateRef<unknown>>(TemplateRef);
}

/** Marks what stands at the bar's end: the rail, the actions of the page. */
@Directive({ selector: 'ng-template[ehBarActions]' })
export class BarActions {
  readonly template = inject<TemplateRef<unknown>>(TemplateRef);
}

/**
 * Fills the bar from within a page; draws nothing where it stands. The heading is the page's `h1`
 * and names the browser's tab.
 *
 * ```html
 * <eh-bar [heading]="title" [contextText]="study.title" [contextLink]="['/studies', study.id]">
 *   <ng-template ehBarBeside><eh-stage-stamp stage="drafting" /></ng-template>
 *   <ng-template ehBarActions><button class="button primary">Download</button></ng-template>
 * </eh-bar>
 * ```
 */
@Component({
  selector: 'eh-bar',
  template: '',
  styles: ':host { display: none }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Bar implements BarContent, OnInit {
  readonly heading = input.required<string>();
  /** A small line above the title, and where it leads. */
  readonly contextText = input('');
  readonly contextLink = input<string | readonly string[] | null>(null);

  readonly title = this.heading;
  readonly context = computed(() => {
    const text = this.contextText();
    return text === '' ? null : { text, link: this.contextLink() };
  });

  private readonly bar = inject(PageBar);
  private readonly besideSlot = contentChild(BarBeside);
  private readonly actionsSlot = contentChild(BarActions);
  readonly beside = computed(() => this.besideSlot()?.template);
  readonly actions = computed(() => this.actionsSlot()?.template);

  constructor() {
    const tab = inject(Title);
    effect(() => {
      tab.setTitle(`${this.heading()} · Evenhand`);
    });
    inject(DestroyRef).onDestroy(() => {
      this.bar.clear(this);
    });
  }

  // Not in the constructor: the bar reads inputs, which are set by now.
  ngOnInit(): void {
    this.bar.show(this);
  }
}
