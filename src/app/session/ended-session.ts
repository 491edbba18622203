import { type HttpInterceptorFn, HttpErrorResponse } from '@angular/common/http';
import { inject, Injector } from '@angular/core';
import { Router } from '@angular/router';
import { catchError, throwError } from 'rxjs';
import { Session } from './session';

/** When the server no longer knows the session, whoever was signed in is asked to sign in again and comes back here. */
export const endedSession: HttpInterceptorFn = (request, next) => {
  const injector = inject(Injector);
  return next(request).pipe(
    catchError((error: unknown) => {
      if (error instanceof HttpErrorResponse && error.status === 401 && !request.url.startsWith('/api/auth/')) {
        const session = injector.get(Session);
        const router = injector.get(Router);
        if (session.user()) {
          session.ended();
          void router.navigate(['/sign-in'], { queryParams: { then: router.url, ended: 1 } });
        }
      }
      return throwError(() => error);
    }),
  );
};
