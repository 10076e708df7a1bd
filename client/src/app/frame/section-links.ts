import { ChangeDetectionStrategy, Component, output } from '@angular/core';
import { RouterLink, RouterLinkActive } from '@angular/router';
import { sections } from './sections';

/** The list of places; the one in view is marked. */
@Component({
  selector: 'eh-section-links',
  imports: [RouterLink, RouterLinkActive],
  template: `
    <ul>
      @for (section of sections(); track section.name; let first = $first) {
        <li>
          <a
            [routerLink]="section.link"
            routerLinkActive
            [routerLinkActiveOptions]="{ exact: section.exact }"
            ariaCurrentWhenActive="page"
            (click)="followed.emit()"
          >
            <span class="name">{{ section.name }}</span>
            <span class="initials" aria-hidden="true">{{ section.initials }}</span>
          </a>
        </li>
        @if (first && sections().length > 1) {
          <li class="gap" aria-hidden="true"></li>
        }
      }
    </ul>
  `,
  styleUrl: './section-links.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SectionLinks {
  readonly followed = output();
  protected readonly sections = sections();
}
