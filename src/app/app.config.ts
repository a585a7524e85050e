import { provideHttpClient, withFetch, withInterceptors } from '@angular/common/http';
import {
  inject,
  Injector,
  provideBrowserGlobalErrorListeners,
  type ApplicationConfig,
} from '@angular/core';
import { MAT_FORM_FIELD_DEFAULT_OPTIONS } from '@angular/material/form-field';
import {
  provideRouter,
  TitleStrategy,
  withComponentInputBinding,
  withInMemoryScrolling,
  withNavigationErrorHandler,
} from '@angular/router';
import { APP_ROUTES } from './app.routes';
import { apiErrors } from './platform/api-errors';
import { PageTitle } from './platform/page-title';

/** The bar that says it is fetched on its own: the first page does without it. */
async function sayPageIsMissing(injector: Injector): Promise<void> {
  const { Announcer } = await import('./platform/announcer');
  injector
    .get(Announcer)
    .tell('The page could not be loaded. Check the connection of this computer and try again.');
}

export const appConfig: ApplicationConfig = {
  providers: [
    provideBrowserGlobalErrorListeners(),
    provideRouter(
      APP_ROUTES,
      withComponentInputBinding(),
      withInMemoryScrolling({ scrollPositionRestoration: 'enabled' }),
      withNavigationErrorHandler(() => void sayPageIsMissing(inject(Injector))),
    ),
    // Sends the XSRF-TOKEN cookie back as X-XSRF-TOKEN by itself: the API lives on our own origin.
    provideHttpClient(withFetch(), withInterceptors([apiErrors])),
    { provide: TitleStrategy, useClass: PageTitle },
    {
      provide: MAT_FORM_FIELD_DEFAULT_OPTIONS,
      useValue: { appearance: 'outline', subscriptSizing: 'dynamic' },
    },
  ],
};
