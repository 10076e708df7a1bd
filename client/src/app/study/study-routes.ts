import type { Routes } from '@angular/router';
import { StudyPage } from './study-page';

/** Pages of this feature. */
export const studyRoutes: Routes = [{ path: '', component: StudyPage }];
