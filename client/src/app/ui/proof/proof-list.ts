import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import type { NestedList } from './nested-list';
import { ProofRuns } from './proof-runs';

/** A list with the lists inside it. */
@Component({
  selector: 'eh-proof-list',
  imports: [ProofRuns],
  templateUrl: './proof-list.html',
  styles: `
    :host {
      display: block;
    }
    ul,
    ol {
      padding-left: 22px;
      list-style: revert;
    }
    li {
      padding-bottom: 2px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProofList {
  readonly list = input.required<NestedList>();
  readonly referenceFollowed = output<string>();
}
