import { DOCUMENT, effect, inject, Injectable } from '@angular/core';
import { remembered } from '../remembered';

/** Ways to choose between light and dark. */
export const THEME_CHOICES = ['system', 'light', 'dark'] as const;

/** One of the ways. */
export type ThemeChoice = (typeof THEME_CHOICES)[number];

/** What the ways are called. */
export const THEME_WORDS: Readonly<Record<ThemeChoice, string>> = {
  system: 'System',
  light: 'Light',
  dark: 'Dark',
};

/** Light, dark, or as the system is; kept by this browser. */
@Injectable({ providedIn: 'root' })
export class ThemeStore {
  private readonly root = inject(DOCUMENT).documentElement;

  readonly choice = remembered<ThemeChoice>('evenhand.theme', 'system', readChoice);

  constructor() {
    effect(() => {
      const choice = this.choice();
      if (choice === 'system') delete this.root.dataset.theme;
      else this.root.dataset.theme = choice;
    });
  }
}

function readChoice(kept: unknown): ThemeChoice {
  return THEME_CHOICES.find((choice) => choice === kept) ?? 'system';
}
