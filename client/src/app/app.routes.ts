import type { Routes } from '@angular/router';

export const routes: Routes = [
  {
    path: '',
    title: 'Your desk · Evenhand',
    loadComponent: async () => (await import('./desk/desk-page')).DeskPage,
  },
];
