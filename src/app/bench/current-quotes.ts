import { computed, DestroyRef, effect, inject, Injectable, signal, untracked } from '@angular/core';
import { catchError, concatMap, finalize, map, type Observable, of, Subject, tap } from 'rxjs';
import { type LineInput } from '@shared/contracts/prices';
import { addQuoteLines, createQuote, type Quote, readQuote } from '@shared/contracts/quotes';
import { ApiClient } from '../api-client/api-client';
import { ProblemError } from '../api-client/problem-error';
import { Session } from '../session/session';

/** What the Bench says of a quote that lines are being added to. */
export interface CurrentQuote {
  id: string;
  number: string;
  tradeAccount: string;
  lines: number;
  /** the dealer it belongs to */
  company: string | undefined;
}

/** A line that was added, as the quote holds it. */
export interface AddedLine {
  quote: CurrentQuote;
  line: Quote['lines'][number];
  /** it made the quote */
  began: boolean;
}

interface Job {
  line: LineInput;
  tradeAccount: string;
}

/** A quote that takes no more lines: the next line begins another. */
const closed = new Set(['quote-expired', 'not-in-this-state', 'not-found']);

/**
 * The quotes being written on the Bench, one a trade account. Lines go out one after the other, so
 * that quick hands begin one quote and not two.
 */
@Injectable()
export class CurrentQuotes {
  private readonly api = inject(ApiClient);
  private readonly session = inject(Session);
  private readonly jobs = new Subject<Job>();
  private readonly waiting = signal(0);
  private readonly open = signal<readonly CurrentQuote[]>([]);
  /** identities from the address that were not read yet */
  private readonly unread = signal<readonly string[]>([]);
  private readonly reading = new Set<string>();
  /** the address named a quote that takes no more lines, or is not one of ours */
  readonly refused = signal(false);

  readonly adding = computed(() => this.waiting() > 0);
  readonly added = signal<AddedLine | null>(null);
  readonly problem = signal<ProblemError | null>(null);
  /** those of the company that is signed in now */
  private readonly own = computed(() => this.open().filter(({ company }) => company === this.session.user()?.company.id));
  /** identities of all quotes being written, for the address */
  readonly ids = computed(() => [...this.own().map(({ id }) => id), ...this.unread()]);

  constructor() {
    this.jobs.pipe(concatMap((job) => this.work(job))).subscribe();
    effect(() => {
      if (!this.session.may('quotes.read')) return;
      for (const id of this.unread()) if (!this.reading.has(id)) this.read(id);
    });
    inject(DestroyRef).onDestroy(() => this.jobs.complete());
  }

  at(tradeAccount: string | undefined): CurrentQuote | undefined {
    return this.own().find((quote) => quote.tradeAccount === tradeAccount);
  }

  /** The next line at this trade account begins another quote. */
  letGo(tradeAccount: string): void {
    this.open.update((open) => open.filter((quote) => quote.tradeAccount !== tradeAccount));
    this.added.set(null);
  }

  /** Adds a line to the quote at a trade account; the first line begins it. */
  add(line: LineInput, tradeAccount: string): void {
    this.waiting.update((n) => n + 1);
    this.problem.set(null);
    this.jobs.next({ line, tradeAccount });
  }

  /** Takes up the quotes that an address names, once somebody is signed in who may read them. */
  use(ids: readonly string[]): void {
    const wanted = ids.filter((id) => /^[\w.~-]{1,64}$/.test(id)).slice(0, 10);
    const missing = wanted.filter((id) => !untracked(this.ids).includes(id));
    if (missing.length > 0) this.unread.update((before) => [...before, ...missing]);
  }

  private read(id: string): void {
    this.reading.add(id);
    this.api
      .call(readQuote, { params: { id } })
      .pipe(catchError(() => of(null)))
      .subscribe((quote) => {
        this.reading.delete(id);
        this.unread.update((before) => before.filter((other) => other !== id));
        if (quote?.state === 'open') this.remember(quote);
        else this.refused.set(true);
      });
  }

  private work({ line, tradeAccount }: Job): Observable<unknown> {
    const current = this.at(tradeAccount);
    const begin = () =>
      this.api.call(createQuote, { body: { tradeAccount, lines: [line] } }).pipe(map((quote) => ({ quote, began: true })));
    const answer = current
      ? this.api.call(addQuoteLines, { params: { id: current.id }, body: { lines: [line] } }).pipe(
          map((quote) => ({ quote, began: false })),
          catchError((error: unknown) => {
            const problem = ProblemError.from(error);
            if (!closed.has(problem.code)) throw problem;
            this.open.update((open) => open.filter(({ id }) => id !== current.id));
            return begin();
          }),
        )
      : begin();
    return answer.pipe(
      tap(({ quote, began }) => {
        const remembered = this.remember(quote);
        const last = quote.lines.at(-1);
        if (last) this.added.set({ quote: remembered, line: last, began });
      }),
      catchError((error: unknown) => {
        this.problem.set(ProblemError.from(error));
        return of(null);
      }),
      finalize(() => this.waiting.update((n) => n - 1)),
    );
  }

  private remember({ id, number, tradeAccount, lines }: Quote): CurrentQuote {
    const quote = { id, number, tradeAccount, lines: lines.length, company: this.session.user()?.company.id };
    this.open.update((open) => [...open.filter((other) => other.tradeAccount !== tradeAccount), quote]);
    return quote;
  }
}
