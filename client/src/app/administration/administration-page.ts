import { ChangeDetectionStrategy, Component } from '@angular/core';
import { Bar } from '../ui/bar/bar';

@Component({
  selector: 'eh-administration-page',
  imports: [Bar],
  template: '<eh-bar heading="Administration" />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AdministrationPage {}
