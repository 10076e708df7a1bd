import type { Routes } from '@angular/router';
import { leaveReportGuard } from './report-page/leave-report-guard';

/** The reports of a study, and one of them. */
export const reportWorkspaceRoutes: Routes = [
  {
    path: '',
    loadComponent: async () => (await import('./report-list/report-list-page')).ReportListPage,
  },
  {
    path: ':reportId',
    canDeactivate: [leaveReportGuard],
    loadComponent: async () =>
      (await import('./report-page/report-workspace-page')).ReportWorkspacePage,
  },
];
