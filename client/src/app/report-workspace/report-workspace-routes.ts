import type { Routes } from '@angular/router';

export const reportWorkspaceRoutes: Routes = [];
