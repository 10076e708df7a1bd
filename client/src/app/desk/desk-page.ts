import { ChangeDetectionStrategy, Component } from '@angular/core';

@Component({
  selector: 'eh-desk-page',
  template: `
    <main>
      <h1>Your desk</h1>
    </main>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DeskPage {}
