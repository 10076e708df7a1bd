import { ChangeDetectionStrategy, Component, type ElementRef, viewChild } from '@angular/core';
import { Icon } from '../ui/marks/icon';
import { SectionLinks } from './section-links';
import { SpineEnd } from './spine-end';

/** On phones the spine is this menu in the bar. */
@Component({
  selector: 'eh-section-menu',
  imports: [Icon, SectionLinks, SpineEnd],
  template: `
    <button type="button" class="icon-button" popovertarget="section-menu">
      <eh-icon name="menu" />
      <span class="sr">Sections</span>
    </button>
    <nav #menu popover id="section-menu" aria-label="Sections">
      <eh-section-links (followed)="close()" />
      <eh-spine-end />
    </nav>
  `,
  styleUrl: './section-menu.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SectionMenu {
  private readonly menu = viewChild.required<ElementRef<HTMLElement>>('menu');

  protected close(): void {
    this.menu().nativeElement.hidePopover();
  }
}
