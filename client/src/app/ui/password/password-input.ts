import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { ControlContainer, ReactiveFormsModule } from '@angular/forms';
import { Field } from '../field/field';
import { FieldControl } from '../field/field-control';
import { Icon } from '../marks/icon';

/** A password field of the form around it, whose text can be shown. */
@Component({
  selector: 'eh-password-input',
  imports: [Field, FieldControl, Icon, ReactiveFormsModule],
  viewProviders: [
    { provide: ControlContainer, useFactory: () => inject(ControlContainer, { skipSelf: true }) },
  ],
  template: `
    <eh-field [label]="label()" [help]="help()" [problem]="problem()">
      <ng-content fieldAction select="[fieldAction]" ngProjectAs="[fieldAction]" />
      <span class="shell">
        <input
          ehControl
          class="input"
          [type]="shown() ? 'text' : 'password'"
          [autocomplete]="autocomplete()"
          [formControlName]="name()"
        />
        <button
          type="button"
          class="icon-button"
          [attr.aria-label]="shown() ? 'Hide the password' : 'Show the password'"
          [attr.aria-pressed]="shown()"
          (click)="shown.set(!shown())"
        >
          <eh-icon name="see" />
        </button>
      </span>
    </eh-field>
  `,
  styleUrl: './password-input.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PasswordInput {
  readonly name = input.required<string>();
  readonly label = input.required<string>();
  readonly help = input('');
  readonly problem = input<string | null>(null);
  readonly autocomplete = input<'current-password' | 'new-password'>('current-password');

  protected readonly shown = signal(false);
}
