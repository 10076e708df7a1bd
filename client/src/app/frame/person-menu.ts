import {
  ChangeDetectionStrategy,
  Component,
  type ElementRef,
  inject,
  viewChild,
} from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import { CurrentStudy } from '../session/current-study';
import { SessionStore } from '../session/session-store';

/** The initials of whoever is signed in; opens what concerns them. */
@Component({
  selector: 'eh-person-menu',
  imports: [RouterLink],
  templateUrl: './person-menu.html',
  styleUrl: './person-menu.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PersonMenu {
  private readonly router = inject(Router);
  private readonly study = inject(CurrentStudy);
  private readonly menu = viewChild<ElementRef<HTMLElement>>('menu');
  protected readonly session = inject(SessionStore);

  protected close(): void {
    this.menu()?.nativeElement.hidePopover();
  }

  protected signOut(): void {
    this.close();
    this.session.signOut().subscribe(() => {
      this.study.close();
      void this.router.navigateByUrl('/sign-in');
    });
  }
}
