import { Directive, ElementRef, inject } from '@angular/core';

/** What a field tells its control. */
export interface FieldLink {
  readonly id: string;
  readonly describedBy: string;
  readonly invalid: boolean;
}

/** Ties a control to the label, help and problem of the `eh-field` around it. */
@Directive({ selector: '[ehControl]' })
export class FieldControl {
  private readonly element = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;

  link(link: FieldLink): void {
    this.element.id = link.id;
    this.element.setAttribute('aria-invalid', String(link.invalid));
    if (link.describedBy === '') this.element.removeAttribute('aria-describedby');
    else this.element.setAttribute('aria-describedby', link.describedBy);
  }
}
