import type { Routes } from '@angular/router';

export const intakeRoutes: Routes = [];
