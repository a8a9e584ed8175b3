import { provideHttpClient, withFetch, withInterceptors } from '@angular/common/http';
import {
  type ApplicationConfig,
  inject,
  provideAppInitializer,
  provideBrowserGlobalErrorListeners,
  provideZonelessChangeDetection,
} from '@angular/core';
import { provideRouter, TitleStrategy, withComponentInputBinding, withInMemoryScrolling } from '@angular/router';
import { appRoutes } from './app.routes';
import { csrf } from './server/csrf';
import { problems } from './server/problems';
import { expiry } from './session/expiry';
import { PageTitles } from './shell/page-titles';
import { ThemeChoice } from './theme/theme-choice';

export const appConfig: ApplicationConfig = {
  providers: [
    provideBrowserGlobalErrorListeners(),
    provideZonelessChangeDetection(),
    provideRouter(
      appRoutes,
      withComponentInputBinding(),
      withInMemoryScrolling({ scrollPositionRestoration: 'enabled', anchorScrolling: 'enabled' }),
    ),
    // Order matters: the token goes on last, so that a request repeated after a new sign-in carries the new one.
    provideHttpClient(withFetch(), withInterceptors([expiry, problems, csrf])),
    provideAppInitializer(() => inject(ThemeChoice).apply()),
    { provide: TitleStrategy, useClass: PageTitles },
  ],
};
