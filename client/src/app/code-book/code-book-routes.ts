import type { Routes } from '@angular/router';
import { unsavedWorkGuard } from '../ui/unsaved-work-guard';
import { CodeBookListPage } from './code-book-list-page';

/** Pages of this feature. */
export const codeBookRoutes: Routes = [
  { path: '', component: CodeBookListPage },
  {
    path: ':dataSetId',
    canDeactivate: [unsavedWorkGuard],
    loadComponent: async () => (await import('./code-book-page')).CodeBookPage,
  },
];
