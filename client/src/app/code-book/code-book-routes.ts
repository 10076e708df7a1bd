import type { Routes } from '@angular/router';

export const codeBookRoutes: Routes = [];
