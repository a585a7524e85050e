import { HttpErrorResponse, type HttpInterceptorFn } from '@angular/common/http';
import { inject, Injector } from '@angular/core';
import { Router } from '@angular/router';
import { catchError, from, switchMap, throwError, type Observable } from 'rxjs';
import type { ApiFailure } from './api-problem';
import { apiFailureOf } from './api-problem';
import { SessionStore } from './session-store';

/**
 * Every failed request comes out as an `ApiFailure`. A session that has ended leads to the sign-in
 * page, which brings the person back to where they were.
 */
export const apiErrors: HttpInterceptorFn = (request, next) => {
  const injector = inject(Injector);
  return next(request).pipe(
    catchError((thrown: unknown) =>
      failureWithText(thrown).pipe(
        switchMap((failure) => {
          if (failure.code === 'not-signed-in') sendToSignIn(injector);
          return throwError(() => failure);
        }),
      ),
    ),
  );
};

/** A refused download arrives as a Blob; its text holds the problem. */
function failureWithText(thrown: unknown): Observable<ApiFailure> {
  if (thrown instanceof HttpErrorResponse && thrown.error instanceof Blob) {
    return from(
      thrown.error.text().then((text) => {
        const { status, headers } = thrown;
        return apiFailureOf(new HttpErrorResponse({ status, headers, error: text }));
      }),
    );
  }
  return from([apiFailureOf(thrown)]);
}

function sendToSignIn(injector: Injector): void {
  const router = injector.get(Router);
  injector.get(SessionStore).forget();
  if (router.url.startsWith('/sign-in')) return;
  void router.navigate(['/sign-in'], { queryParams: { next: router.url, ended: true } });
}
