import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Logo } from '../ui/marks/logo';
import { SectionLinks } from './section-links';
import { SpineEnd } from './spine-end';

/** The dark spine: the way between sections. */
@Component({
  selector: 'eh-spine',
  imports: [Logo, RouterLink, SectionLinks, SpineEnd],
  template: `
    <nav aria-label="Sections">
      <a class="mark" routerLink="/desk" aria-label="Evenhand, go to your desk"><eh-logo /></a>
      <eh-section-links />
      <eh-spine-end />
    </nav>
  `,
  styleUrl: './spine.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Spine {}
