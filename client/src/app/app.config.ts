import { provideHttpClient, withInterceptors, withXsrfConfiguration } from '@angular/common/http';
import {
  inject,
  provideAppInitializer,
  provideBrowserGlobalErrorListeners,
  type ApplicationConfig,
} from '@angular/core';
import {
  provideRouter,
  withComponentInputBinding,
  withInMemoryScrolling,
  withRouterConfig,
} from '@angular/router';
import { routes } from './app.routes';
import { ThemeStore } from './ui/theme/theme-store';
import { problemInterceptor } from './server-api/problem-interceptor';
import { sessionInterceptor } from './session/session-interceptor';

/** What the whole client shares. */
export const appConfig: ApplicationConfig = {
  providers: [
    provideBrowserGlobalErrorListeners(),
    provideRouter(
      routes,
      withComponentInputBinding(),
      withInMemoryScrolling({ anchorScrolling: 'enabled' }),
      withRouterConfig({ paramsInheritanceStrategy: 'always' }),
    ),
    // Not over fetch: it cannot tell how much of an upload was sent.
    provideHttpClient(
      withInterceptors([sessionInterceptor, problemInterceptor]),
      withXsrfConfiguration({ cookieName: 'XSRF-TOKEN', headerName: 'X-XSRF-TOKEN' }),
    ),
    provideAppInitializer(() => {
      inject(ThemeStore);
    }),
  ],
};
