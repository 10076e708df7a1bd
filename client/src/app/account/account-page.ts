import { ChangeDetectionStrategy, Component } from '@angular/core';
import { Bar } from '../ui/bar/bar';

@Component({
  selector: 'eh-account-page',
  imports: [Bar],
  template: '<eh-bar heading="Account" />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AccountPage {}
