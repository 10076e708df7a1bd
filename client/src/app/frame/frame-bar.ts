import { NgTemplateOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { PageBar } from '../ui/bar/page-bar';
import { PersonMenu } from './person-menu';
import { SectionMenu } from './section-menu';

/** The bar over the page: its title, what stands beside it, and its actions. */
@Component({
  selector: 'eh-frame-bar',
  imports: [NgTemplateOutlet, PersonMenu, RouterLink, SectionMenu],
  templateUrl: './frame-bar.html',
  styleUrl: './frame-bar.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FrameBar {
  protected readonly bar = inject(PageBar);
}
