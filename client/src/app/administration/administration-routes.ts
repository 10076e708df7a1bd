import type { Routes } from '@angular/router';
import { AdministrationPage } from './administration-page';

/** Pages of this feature. */
export const administrationRoutes: Routes = [{ path: '', component: AdministrationPage }];
