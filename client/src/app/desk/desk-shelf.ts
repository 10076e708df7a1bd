import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { ROLE_WORDS } from '../ui/words';
import type { ShelvedStudy } from './desk-store';

/** The studies, spine by spine. */
@Component({
  selector: 'eh-desk-shelf',
  imports: [RouterLink],
  template: `
    <h2>Studies on the shelf</h2>
    <ul>
      @for (each of shelf(); track each.study.id) {
        <li>
          <a [routerLink]="['/studies', each.study.id]">
            <b>{{ each.study.title }}</b>
            <span>
              @if (each.study.invented) {
                Invented data,
              }
              {{ cutWords(each) }}, {{ roles[each.study.role].name.toLowerCase() }}
            </span>
          </a>
        </li>
      } @empty {
        <li class="second">The shelf is empty.</li>
      }
    </ul>
  `,
  styleUrl: './desk-shelf.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DeskShelf {
  readonly shelf = input.required<readonly ShelvedStudy[]>();

  protected readonly roles = ROLE_WORDS;

  protected cutWords({ study }: ShelvedStudy): string {
    return study.latestCutNumber === null ? 'no data yet' : `cut ${study.latestCutNumber}`;
  }
}
