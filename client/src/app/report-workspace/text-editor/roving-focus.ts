import { afterNextRender, Directive, ElementRef, inject } from '@angular/core';

const STEPS: Readonly<Record<string, number>> = { ArrowRight: 1, ArrowLeft: -1 };

/** Makes a row of buttons one stop of the Tab key; the arrow keys go from button to button. */
@Directive({
  selector: '[ehRovingFocus]',
  host: {
    role: 'toolbar',
    '(keydown)': 'move($event)',
    '(focusin)': 'remember($event.target)',
  },
})
export class RovingFocus {
  private readonly row = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;

  constructor() {
    afterNextRender(() => {
      this.makeOneStop(this.stops()[0]);
    });
  }

  protected move(event: KeyboardEvent): void {
    const step = STEPS[event.key];
    const stops = this.stops();
    const place = stops.indexOf(event.target as HTMLElement);
    if (step === undefined || place === -1) return;
    event.preventDefault();
    stops[(place + step + stops.length) % stops.length]?.focus();
  }

  protected remember(target: EventTarget | null): void {
    this.makeOneStop(target as HTMLElement);
  }

  private makeOneStop(chosen: HTMLElement | undefined): void {
    const stops = this.stops();
    if (chosen === undefined || !stops.includes(chosen)) return;
    for (const stop of stops) stop.tabIndex = stop === chosen ? 0 : -1;
  }

  private stops(): readonly HTMLElement[] {
    return [...this.row.querySelectorAll<HTMLElement>('[data-stop]')];
  }
}
