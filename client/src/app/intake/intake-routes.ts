import type { Routes } from '@angular/router';
import { inject } from '@angular/core';
import { type CanActivateFn, RedirectCommand, Router } from '@angular/router';
import { CurrentStudy } from '../session/current-study';
import { DataPage } from './data-page/data-page';

/** Only for whoever may load data; everybody else goes to the list. */
const mayEditData: CanActivateFn = (route) => {
  const studyId = route.paramMap.get('studyId') ?? '';
  const list = inject(Router).createUrlTree(['/studies', studyId, 'data']);
  return inject(CurrentStudy).may('editData') || new RedirectCommand(list);
};

/** Pages of this feature. */
export const intakeRoutes: Routes = [
  { path: '', component: DataPage },
  {
    path: 'new',
    canActivate: [mayEditData],
    loadComponent: async () => (await import('./new-cut/new-cut-page')).NewCutPage,
  },
  {
    path: 'typed-counts',
    canActivate: [mayEditData],
    loadComponent: async () => (await import('./typed-counts/typed-counts-page')).TypedCountsPage,
  },
  {
    path: 'cuts/:cutId',
    loadComponent: async () => (await import('./cut-page/cut-page')).CutPage,
  },
];
