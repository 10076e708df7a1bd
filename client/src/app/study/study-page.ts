import { ChangeDetectionStrategy, Component } from '@angular/core';
import { Bar } from '../ui/bar/bar';

@Component({
  selector: 'eh-study-page',
  imports: [Bar],
  template: '<eh-bar heading="Study" />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StudyPage {}
