import { ChangeDetectionStrategy, Component } from '@angular/core';
import { Bar } from '../ui/bar/bar';

@Component({
  selector: 'eh-help-page',
  imports: [Bar],
  template: '<eh-bar heading="Help" />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HelpPage {}
