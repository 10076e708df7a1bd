import type { Routes } from '@angular/router';

export const analysisBenchRoutes: Routes = [];
