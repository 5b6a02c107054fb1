import { HttpErrorResponse, type HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { Router } from '@angular/router';
import { catchError, throwError } from 'rxjs';
import { SessionStore } from './session';

/** A session that ran out in the middle of work: forget it and ask to sign in, keeping the address. */
export const sessionExpiry: HttpInterceptorFn = (request, next) => {
  const session = inject(SessionStore);
  const router = inject(Router);
  return next(request).pipe(
    catchError((error: unknown) => {
      if (error instanceof HttpErrorResponse && error.status === 401 && session.user() !== null) {
        session.forget();
        void router.navigate(['/sign-in'], { queryParams: { then: router.url } });
      }
      return throwError(() => error);
    }),
  );
};
