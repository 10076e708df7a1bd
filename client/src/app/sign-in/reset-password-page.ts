import { ChangeDetectionStrategy, Component } from '@angular/core';

@Component({
  selector: 'eh-reset-password-page',
  template: '<main></main>',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ResetPasswordPage {}
