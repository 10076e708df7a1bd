import {
  ChangeDetectionStrategy,
  Component,
  type ElementRef,
  inject,
  viewChild,
} from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { PageBar } from '../ui/bar/page-bar';
import { FrameBar } from './frame-bar';
import { focusAfterNavigation } from './focus-after-navigation';
import { frameKeys } from './frame-keys';
import { KeyStrip } from './key-strip';
import { Spine } from './spine';

/** What stands around every page: spine, bar, the page itself, and the strip of keys. */
@Component({
  selector: 'eh-frame',
  imports: [RouterOutlet, FrameBar, KeyStrip, Spine],
  templateUrl: './frame.html',
  styleUrl: './frame.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Frame {
  protected readonly bar = inject(PageBar);
  private readonly main = viewChild.required<ElementRef<HTMLElement>>('main');

  constructor() {
    frameKeys();
    focusAfterNavigation(() => this.main().nativeElement);
  }

  protected skipToPage(event: Event): void {
    event.preventDefault();
    this.main().nativeElement.focus();
  }
}
