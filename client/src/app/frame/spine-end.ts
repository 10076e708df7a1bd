import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink, RouterLinkActive } from '@angular/router';
import { KeysDialogOpener } from './keys-dialog-opener';
import { THEME_CHOICES, THEME_WORDS, ThemeStore } from '../ui/theme/theme-store';

/** The foot of the spine: help, keys and the theme. */
@Component({
  selector: 'eh-spine-end',
  imports: [RouterLink, RouterLinkActive],
  templateUrl: './spine-end.html',
  styleUrls: ['./section-links.scss', './spine-end.scss'],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpineEnd {
  private readonly theme = inject(ThemeStore);
  private readonly keysDialog = inject(KeysDialogOpener);

  protected readonly themeWord = computed(() => THEME_WORDS[this.theme.choice()]);
  protected readonly nextWord = computed(() => THEME_WORDS[this.next()].toLowerCase());
  private readonly next = computed(() => {
    const place = THEME_CHOICES.indexOf(this.theme.choice());
    return THEME_CHOICES[(place + 1) % THEME_CHOICES.length] ?? 'system';
  });

  protected showKeys(): void {
    this.keysDialog.open();
  }

  protected changeTheme(): void {
    this.theme.choice.set(this.next());
  }
}
