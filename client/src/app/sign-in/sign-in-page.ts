import { ChangeDetectionStrategy, Component } from '@angular/core';

@Component({
  selector: 'eh-sign-in-page',
  template: '<main></main>',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignInPage {}
