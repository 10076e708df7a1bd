import type { Routes } from '@angular/router';
import { CodeBookListPage } from './code-book-list-page';

/** Pages of this feature. */
export const codeBookRoutes: Routes = [
  { path: '', component: CodeBookListPage },
  {
    path: ':dataSetId',
    loadComponent: async () => (await import('./code-book-page')).CodeBookPage,
  },
];
