import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { NewPasswordForm } from './new-password-form';
import { RequestResetForm } from './request-reset-form';
import { SignInLayout } from './sign-in-layout';

/** A forgotten password: asks for the mail, and takes the new one when its link was followed. */
@Component({
  selector: 'eh-reset-password-page',
  imports: [NewPasswordForm, RequestResetForm, SignInLayout],
  template: `
    <eh-sign-in-layout>
      @if (token(); as token) {
        <eh-new-password-form [token]="token" />
      } @else {
        <eh-request-reset-form [address]="email() ?? ''" />
      }
    </eh-sign-in-layout>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ResetPasswordPage {
  /** Query parameter of the link in the mail. */
  readonly token = input<string>();
  /** Query parameter: the address that was typed on the sign-in page. */
  readonly email = input<string>();
}
