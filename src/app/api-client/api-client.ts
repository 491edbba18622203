import { HttpClient, HttpHeaders } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { catchError, map, type Observable, throwError } from 'rxjs';
import { type AnswerOf, type BodyOf, type Endpoint, type ParamsOf, type QueryOf } from '@shared/contracts/endpoint';
import { ProblemError } from './problem-error';

type Part<Name extends string, T> = undefined extends T ? Partial<Record<Name, T>> : Record<Name, T>;

/** What a call needs besides its endpoint: params, query and body as the contract has them. */
export type Call<E extends Endpoint> = Part<'params', ParamsOf<E>> &
  Partial<Record<'query', QueryOf<E>>> &
  Part<'body', BodyOf<E>> & { idempotencyKey?: string };

/** The only door to HTTP: calls an endpoint of the contracts and answers its type, or fails with a ProblemError. */
@Injectable({ providedIn: 'root' })
export class ApiClient {
  private readonly http = inject(HttpClient);

  call<E extends Endpoint>(
    endpoint: E,
    ...[call]: Record<string, never> extends Call<E> ? [Call<E>?] : [Call<E>]
  ): Observable<AnswerOf<E>> {
    const { params, query, body, idempotencyKey } = (call ?? {}) as {
      params?: object;
      query?: object;
      body?: unknown;
      idempotencyKey?: string;
    };
    return this.http
      .request<unknown>(endpoint.method, addressOf(endpoint.path, params), {
        body,
        params: Object.fromEntries(Object.entries(query ?? {}).filter(([, value]) => value !== undefined && value !== '')) as Record<
          string,
          string
        >,
        headers: idempotencyKey ? new HttpHeaders({ 'Idempotency-Key': idempotencyKey }) : undefined,
      })
      .pipe(
        // An answer that does not fit its contract is a defect; it must not travel on as if it did.
        map((answer) => (endpoint.answer ? endpoint.answer.parse(answer) : undefined) as AnswerOf<E>),
        catchError((error: unknown) => throwError(() => ProblemError.from(error))),
      );
  }
}

/** Fills the `:names` of a path. */
export function addressOf(path: string, params: object | undefined): string {
  return path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(String((params as Record<string, unknown> | undefined)?.[name])));
}
