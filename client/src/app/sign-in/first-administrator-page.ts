import { ChangeDetectionStrategy, Component } from '@angular/core';

@Component({
  selector: 'eh-first-administrator-page',
  template: '<main></main>',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FirstAdministratorPage {}
