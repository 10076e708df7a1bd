import type { Routes } from '@angular/router';
import { signedOutGuard, signInGuard } from './session/sign-in-guard';

const signedOutPages: Routes = [
  {
    path: 'sign-in',
    title: 'Sign in · Evenhand',
    canActivate: [signedOutGuard],
    loadComponent: async () => (await import('./sign-in/sign-in-page')).SignInPage,
  },
  {
    path: 'first-administrator',
    title: 'First administrator · Evenhand',
    canActivate: [signedOutGuard],
    loadComponent: async () =>
      (await import('./sign-in/first-administrator-page')).FirstAdministratorPage,
  },
  {
    path: 'reset-password',
    title: 'Reset your password · Evenhand',
    loadComponent: async () => (await import('./sign-in/reset-password-page')).ResetPasswordPage,
  },
];

/** Every page. All of them are loaded when they are first opened. */
export const routes: Routes = [
  ...signedOutPages,
  {
    path: '',
    canActivate: [signInGuard],
    loadChildren: async () => (await import('./frame/frame-routes')).frameRoutes,
  },
];
