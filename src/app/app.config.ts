import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { inject, provideAppInitializer, type ApplicationConfig } from '@angular/core';
import { MAT_FORM_FIELD_DEFAULT_OPTIONS } from '@angular/material/form-field';
import { provideRouter, TitleStrategy, withComponentInputBinding, withInMemoryScrolling } from '@angular/router';
import { catchError, of } from 'rxjs';
import { APP_ROUTES } from './app.routes';
import { PageTitle } from './core/page-title';
import { SessionStore } from './core/session';
import { sessionExpiry } from './core/session-expiry';
import { ThemeStore } from './core/theme';
import { provideIcons } from './ui/provide-icons';

export const APP_CONFIG: ApplicationConfig = {
  providers: [
    provideRouter(
      APP_ROUTES,
      withComponentInputBinding(),
      withInMemoryScrolling({ scrollPositionRestoration: 'enabled', anchorScrolling: 'enabled' }),
    ),
    provideHttpClient(withInterceptors([sessionExpiry])),
    provideIcons(),
    provideAppInitializer(() => {
      inject(ThemeStore);
      // Without a server the public page still says what is wrong, so a failure here does not stop the start.
      return inject(SessionStore)
        .load()
        .pipe(catchError(() => of(null)));
    }),
    { provide: TitleStrategy, useExisting: PageTitle },
    {
      provide: MAT_FORM_FIELD_DEFAULT_OPTIONS,
      useValue: { appearance: 'outline', floatLabel: 'always', subscriptSizing: 'dynamic' },
    },
  ],
};
