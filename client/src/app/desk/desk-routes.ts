import type { Routes } from '@angular/router';
import { DeskPage } from './desk-page';

/** Pages of this feature. */
export const deskRoutes: Routes = [{ path: '', component: DeskPage }];
