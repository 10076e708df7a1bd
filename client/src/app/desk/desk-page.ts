import { ChangeDetectionStrategy, Component } from '@angular/core';
import { Bar } from '../ui/bar/bar';

@Component({
  selector: 'eh-desk-page',
  imports: [Bar],
  template: '<eh-bar heading="Desk" />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DeskPage {}
