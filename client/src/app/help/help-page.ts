import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink, RouterLinkActive } from '@angular/router';
import { MarkdownComponent, MARKED_EXTENSIONS, provideMarkdown } from 'ngx-markdown';
import { Bar } from '../ui/bar/bar';
import { markupAsText } from '../ui/markdown/markup-as-text';
import { HELP_TOPICS } from './help-topics';

/** The built-in help: topics at the left, one of them on the page. */
@Component({
  selector: 'eh-help-page',
  imports: [Bar, MarkdownComponent, RouterLink, RouterLinkActive],
  providers: [
    provideMarkdown({
      markedExtensions: [{ provide: MARKED_EXTENSIONS, useValue: markupAsText, multi: true }],
    }),
  ],
  templateUrl: './help-page.html',
  styleUrl: './help-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HelpPage {
  /** Path parameter; an unknown topic shows the first. */
  readonly topic = input<string>();

  protected readonly topics = HELP_TOPICS;
  protected readonly shown = computed(
    () => HELP_TOPICS.find(({ path }) => path === this.topic()) ?? HELP_TOPICS[0],
  );
}
