import { type HttpBackend, HttpErrorResponse, type HttpEvent, type HttpRequest, HttpResponse } from '@angular/common/http';
import { inject, REQUEST_CONTEXT } from '@angular/core';
import { from, mergeMap, type Observable, of, throwError } from 'rxjs';

/** What the server hands in: the API, called without a network in between, as a visitor. */
export interface ApiInProcess {
  answer(request: { method: string; url: string; body: unknown }): Promise<{ status: number; body: unknown }>;
}

/** While a page is rendered on the server, calls go straight to the API of the same process. */
export class InProcessBackend implements HttpBackend {
  private readonly api = (inject(REQUEST_CONTEXT, { optional: true }) as { api?: ApiInProcess } | null)?.api;

  handle(request: HttpRequest<unknown>): Observable<HttpEvent<unknown>> {
    if (!this.api) return throwError(() => new HttpErrorResponse({ status: 503, url: request.url, statusText: 'no API at hand' }));
    return from(this.api.answer({ method: request.method, url: request.urlWithParams, body: request.body })).pipe(
      mergeMap(({ status, body }) =>
        status < 400
          ? of(new HttpResponse({ status, body, url: request.url }))
          : throwError(() => new HttpErrorResponse({ status, error: body, url: request.url })),
      ),
    );
  }
}
