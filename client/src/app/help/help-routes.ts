import type { Routes } from '@angular/router';
import { HelpPage } from './help-page';

/** Pages of this feature. */
export const helpRoutes: Routes = [
  { path: '', pathMatch: 'full', redirectTo: 'begin' },
  { path: ':topic', component: HelpPage },
];
