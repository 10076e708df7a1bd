import type { Routes } from '@angular/router';
import { HelpPage } from './help-page';

/** Pages of this feature. */
export const helpRoutes: Routes = [{ path: '', component: HelpPage }];
