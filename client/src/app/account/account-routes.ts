import type { Routes } from '@angular/router';
import { AccountPage } from './account-page';

/** Pages of this feature. */
export const accountRoutes: Routes = [{ path: '', component: AccountPage }];
