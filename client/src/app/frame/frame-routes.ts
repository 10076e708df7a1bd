import type { Routes } from '@angular/router';
import { administratorGuard } from '../session/sign-in-guard';
import { leaveStudyGuard, studyGuard } from '../session/study-guard';
import { Frame } from './frame';

const studyPages: Routes = [
  {
    path: '',
    pathMatch: 'full',
    loadChildren: async () => (await import('../study/study-routes')).studyRoutes,
  },
  {
    path: 'data',
    loadChildren: async () => (await import('../intake/intake-routes')).intakeRoutes,
  },
  {
    path: 'code-book',
    loadChildren: async () => (await import('../code-book/code-book-routes')).codeBookRoutes,
  },
  {
    path: 'analyses',
    loadChildren: async () =>
      (await import('../analysis-bench/analysis-bench-routes')).analysisBenchRoutes,
  },
  {
    path: 'reports',
    loadChildren: async () =>
      (await import('../report-workspace/report-workspace-routes')).reportWorkspaceRoutes,
  },
];

const pages: Routes = [
  { path: '', pathMatch: 'full', redirectTo: 'desk' },
  {
    path: 'desk',
    canActivate: [leaveStudyGuard],
    loadChildren: async () => (await import('../desk/desk-routes')).deskRoutes,
  },
  { path: 'studies/:studyId', canActivate: [studyGuard], children: studyPages },
  {
    path: 'administration',
    canActivate: [administratorGuard],
    loadChildren: async () =>
      (await import('../administration/administration-routes')).administrationRoutes,
  },
  {
    path: 'account',
    loadChildren: async () => (await import('../account/account-routes')).accountRoutes,
  },
  {
    path: 'help',
    loadChildren: async () => (await import('../help/help-routes')).helpRoutes,
  },
  { path: '**', loadComponent: async () => (await import('./not-here-page')).NotHerePage },
];

/** Every page within the frame. */
export const frameRoutes: Routes = [{ path: '', component: Frame, children: pages }];
