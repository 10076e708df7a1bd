import {
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  input,
  signal,
  viewChild,
} from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import { keyCommands } from '../ui/keys/key-commands';
import { Icon } from '../ui/marks/icon';
import { counted } from '../ui/words';
import type { ShelvedStudy } from './desk-store';
import { found } from './found';

/** Finds studies and reports by title. Down goes into what was found, Enter to the first of it. */
@Component({
  selector: 'eh-find-box',
  imports: [Icon, RouterLink],
  templateUrl: './find-box.html',
  styleUrl: './find-box.scss',
  host: { '(focusout)': 'leave($event)', '(keydown.escape)': 'clear()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FindBox {
  readonly shelf = input.required<readonly ShelvedStudy[]>();

  private readonly router = inject(Router);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly box = viewChild.required<ElementRef<HTMLInputElement>>('box');

  protected readonly text = signal('');
  protected readonly found = computed(() => found(this.text(), this.shelf()));
  protected readonly open = computed(() => this.text().trim() !== '');
  protected readonly told = computed(() =>
    this.open() ? `${counted(this.found().length, 'title', 'titles')} found` : '',
  );

  constructor() {
    keyCommands([
      {
        key: '/',
        says: 'Find a study or report',
        group: 'Desk',
        run: () => {
          this.box().nativeElement.focus();
        },
      },
    ]);
  }

  protected type(event: Event): void {
    this.text.set((event.target as HTMLInputElement).value);
  }

  protected followFirst(): void {
    const first = this.found()[0];
    if (first !== undefined) void this.router.navigate([...first.link]);
  }

  protected move(event: Event, by: 1 | -1): void {
    event.preventDefault();
    const stops = [this.box().nativeElement, ...this.host.querySelectorAll('a')];
    const next = stops.indexOf(event.target as HTMLAnchorElement) + by;
    stops[Math.min(Math.max(next, 0), stops.length - 1)]?.focus();
  }

  protected leave(event: FocusEvent): void {
    if (!this.host.contains(event.relatedTarget as Node | null)) this.clear();
  }

  protected clear(): void {
    this.text.set('');
    this.box().nativeElement.value = '';
  }
}
