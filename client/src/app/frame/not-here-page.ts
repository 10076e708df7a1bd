import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Bar } from '../ui/bar/bar';
import { EmptyState } from '../ui/status/empty-state';

/** What stands at an address that leads nowhere, or to a study of other people. */
@Component({
  selector: 'eh-not-here-page',
  imports: [Bar, EmptyState, RouterLink],
  template: `
    <eh-bar heading="Nothing here" />
    <eh-empty-state fact="There is nothing at this address.">
      It may have been removed, or belong to a study that you are not a member of.
      <a routerLink="/desk">Go to your desk</a>
    </eh-empty-state>
  `,
  styles: `
    :host {
      display: block;
      max-width: 720px;
      padding: 36px 28px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotHerePage {}
