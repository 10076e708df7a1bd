import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

const PATHS = {
  find: 'M8 3.5a4.5 4.5 0 1 0 0 9 4.5 4.5 0 0 0 0-9Zm3.5 8 3 3',
  problem: 'M6 2.5h6L15.5 6v6L12 15.5H6L2.5 12V6L6 2.5ZM9 5.8v4M9 12v.01',
  caution: 'M9 2.5 16 15H2L9 2.5ZM9 7v4M9 13v.01',
  clear: 'm3.5 9.5 3.5 3.5 7.5-8',
  see: 'M2 9s2.5-4.5 7-4.5S16 9 16 9s-2.5 4.5-7 4.5S2 9 2 9Zm7-2a2 2 0 1 0 0 4 2 2 0 0 0 0-4Z',
  menu: 'M2.5 5h13M2.5 9h13M2.5 13h13',
  close: 'm4 4 10 10M14 4 4 14',
  down: 'm4.5 7 4.5 4.5L13.5 7',
  right: 'm7 4.5 4.5 4.5L7 13.5',
  add: 'M9 3v12M3 9h12',
  swap: 'M3 6h11l-3-3M15 12H4l3 3',
  drag: 'M7 5v.01M11 5v.01M7 9v.01M11 9v.01M7 13v.01M11 13v.01',
  more: 'M9 4.5v.01M9 9v.01M9 13.5v.01',
  file: 'M5 2.5h5.5L14 6v9.5H5v-13Zm5.5 0V6H14',
} as const;

/** Names of the line drawings. */
export type IconName = keyof typeof PATHS;

/** A small line drawing beside a word; never alone, so it is not read aloud. */
@Component({
  selector: 'eh-icon',
  template: ` <svg viewBox="0 0 18 18" aria-hidden="true"><path [attr.d]="path()" /></svg> `,
  styles: `
    :host {
      display: inline-flex;
      flex: none;
      width: 15px;
      height: 15px;
    }
    svg {
      width: 100%;
      height: 100%;
      fill: none;
      stroke: currentColor;
      stroke-width: 1.5;
      stroke-linecap: round;
      stroke-linejoin: round;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Icon {
  readonly name = input.required<IconName>();
  protected readonly path = computed(() => PATHS[this.name()]);
}
