import { computed, DestroyRef, DOCUMENT, inject, type Signal, signal } from '@angular/core';
import { ThemeStore } from '../../ui/theme/theme-store';

/** Light or dark, as the page is at the moment. */
export function shownTheme(): Signal<'light' | 'dark'> {
  const choice = inject(ThemeStore).choice;
  const system = systemTheme();
  return computed(() => {
    const chosen = choice();
    return chosen === 'system' ? system() : chosen;
  });
}

function systemTheme(): Signal<'light' | 'dark'> {
  const query = inject(DOCUMENT).defaultView?.matchMedia('(prefers-color-scheme: dark)');
  const theme = signal<'light' | 'dark'>(query?.matches === true ? 'dark' : 'light');
  const change = (event: MediaQueryListEvent): void => {
    theme.set(event.matches ? 'dark' : 'light');
  };
  query?.addEventListener('change', change);
  inject(DestroyRef).onDestroy(() => query?.removeEventListener('change', change));
  return theme;
}
