import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { catchError, map, type Observable, of, tap, throwError } from 'rxjs';
import { type readCatalogue } from '@shared/contracts/bench';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { ProblemError } from './problem-error';

/** How long a catalogue is taken as it was read, ms. */
const FRESH = 10 * 60_000;
const path: (typeof readCatalogue)['path'] = '/api/catalogue';

/**
 * Reads the catalogue for pages that only show it. The answer is not parsed again: it comes with
 * the page from the server that made it, and the schemas would weigh more than the page itself.
 */
@Injectable({ providedIn: 'root' })
export class CatalogueReader {
  private readonly http = inject(HttpClient);
  private kept: { catalogue: AnswerOf<typeof readCatalogue>; until: number } | null = null;

  /** Fails with a ProblemError. */
  read(): Observable<AnswerOf<typeof readCatalogue>> {
    if (this.kept && Date.now() < this.kept.until) return of(this.kept.catalogue);
    return this.http.get<unknown>(path).pipe(
      map((answer) => answer as AnswerOf<typeof readCatalogue>),
      tap((catalogue) => (this.kept = { catalogue, until: Date.now() + FRESH })),
      catchError((error: unknown) => throwError(() => ProblemError.from(error))),
    );
  }
}
