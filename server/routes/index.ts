import { administrationRoutes } from './administration/administration-routes';
import { dataRoutes } from './data/data-routes';
import { uploadRoutes } from './data/upload-routes';
import { analysisRoutes } from './analyses/analysis-routes';
import { houseStyleRoutes } from './house-styles/house-style-routes';
import { outsideEstimateRoutes } from './outside-estimates/outside-estimate-routes';
import { exportRoutes } from './reports/export-routes';
import { draftRoutes } from './reports/draft-routes';
import { reportRoutes } from './reports/report-routes';
import { stepRoutes } from './reports/step-routes';
import type { Route } from './route';
import { accountRoutes } from './session/account-routes';
import { sessionRoutes } from './session/session-routes';
import { memberRoutes } from './studies/member-routes';
import { studyPartRoutes } from './studies/study-part-routes';
import { studyRoutes } from './studies/study-routes';
import { systemRoutes } from './system/system-routes';

/**
 * The register: every route of the API, and nothing else is served below `/api`.
 *
 * The Express application, the OpenAPI description and the role × route test all read this list.
 * To add a route:
 *
 * 1. Write its schemas in `shared/api/<resource>.ts`.
 * 2. In `routes/<resource>/<resource>-routes.ts`, define it with the function that says who may
 *    call it: `publicRoute`, `signedInRoute`, `administratorRoute`, `studyRoute(action, …)`, or
 *    `decidedStudyRoute(anyOf, decide, …)` where the request decides. There is no other way to
 *    make a `Route`, so that none is without an answer to that question.
 * 3. Its `handle` (at most 12 lines) passes the parsed call to a service of `services/<resource>/`
 *    and presents the outcome. A refusal is a code of `errors/issues.ts`.
 * 4. Append a new resource's list here, and give each route a "rejects" group in `tests/api/`.
 *
 * Ids below a study must be looked up together with `study.id`: another study's are not found.
 */
export const ROUTES: readonly Route[] = [
  ...systemRoutes(() => ROUTES),
  ...sessionRoutes,
  ...accountRoutes,
  ...administrationRoutes,
  ...studyRoutes,
  ...studyPartRoutes,
  ...memberRoutes,
  ...uploadRoutes,
  ...dataRoutes,
  ...analysisRoutes,
  ...outsideEstimateRoutes,
  ...reportRoutes,
  ...stepRoutes,
  ...draftRoutes,
  ...houseStyleRoutes,
  ...exportRoutes,
];
