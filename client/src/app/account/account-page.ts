import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { RouterLink } from '@angular/router';
import { StudiesApi } from '../server-api/studies-api';
import { SessionStore } from '../session/session-store';
import { Bar } from '../ui/bar/bar';
import { KeyCommands } from '../ui/keys/key-commands';
import { THEME_CHOICES, THEME_WORDS, ThemeStore } from '../ui/theme/theme-store';
import { ROLE_WORDS } from '../ui/words';
import { PasswordChange } from './password-change';

/** What concerns the person alone: their password, their roles, and how the screen behaves. */
@Component({
  selector: 'eh-account-page',
  imports: [Bar, PasswordChange, RouterLink],
  templateUrl: './account-page.html',
  styleUrl: './account-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AccountPage {
  protected readonly person = inject(SessionStore).person;
  protected readonly theme = inject(ThemeStore);
  protected readonly keys = inject(KeyCommands);
  protected readonly studies = toSignal(inject(StudiesApi).list(), { initialValue: [] });

  protected readonly themeChoices = THEME_CHOICES;
  protected readonly themeWords = THEME_WORDS;
  protected readonly roleWords = ROLE_WORDS;

  protected switchSingleKeys(event: Event): void {
    this.keys.singleKeysOn.set((event.target as HTMLInputElement).checked);
  }
}
