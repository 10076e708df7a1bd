import type { Routes } from '@angular/router';
import { unsavedWorkGuard } from '../ui/unsaved-work-guard';
import { AnalysesPage } from './analyses-page';

/** Pages of this feature. The address `new` opens an empty bench. */
export const analysisBenchRoutes: Routes = [
  { path: '', component: AnalysesPage },
  {
    path: ':analysisId',
    canDeactivate: [unsavedWorkGuard],
    loadComponent: async () => (await import('./bench/bench-page')).BenchPage,
  },
];
