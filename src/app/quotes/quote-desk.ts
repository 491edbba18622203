import { computed, DestroyRef, inject, Injectable, signal } from '@angular/core';
import { catchError, concatMap, defer, finalize, map, type Observable, of, Subject, tap } from 'rxjs';
import { type BodyOf } from '@shared/contracts/endpoint';
import { changeQuote, changeQuoteLines, mailQuote, type Quote, type QuoteLine, readQuote, rePriceQuote } from '@shared/contracts/quotes';
import { ApiClient } from '../api-client/api-client';
import { AttemptKey } from '../api-client/attempt-key';
import { loaded } from '../api-client/loaded';
import { ProblemError } from '../api-client/problem-error';
import { type LinesEdit, putBackLine, removeLine } from './line-edits';

interface Job {
  run: (quote: Quote) => Observable<Quote>;
  done: (problem: ProblemError | null) => void;
}

type Details = Omit<BodyOf<typeof changeQuote>, 'revision'>;

/**
 * One quote and every change to it. Changes go out one after the other, each made from the
 * answer to the one before, so that quick hands and a slow line do not get in each other's way.
 */
@Injectable()
export class QuoteDesk {
  private readonly api = inject(ApiClient);
  private readonly jobs = new Subject<Job>();
  private readonly open = signal(0);
  private readonly mailKey = new AttemptKey();
  private readonly id = signal<string | undefined>(undefined);

  readonly source = loaded(this.id, (id) => this.api.call(readQuote, { params: { id } }));
  readonly quote = this.source.value;
  /** Changes are on their way; prices on the screen may be about to change. */
  readonly saving = computed(() => this.open() > 0);
  /** Somebody else changed the quote; until it is read again nothing can be saved. */
  readonly changedMeanwhile = signal(false);
  /** The line removed last, as long as it can be put back with one press. */
  readonly removed = signal<{ line: QuoteLine; index: number } | null>(null);

  constructor() {
    this.jobs.pipe(concatMap((job) => this.work(job))).subscribe();
    // What was begun is finished even when its page is left.
    inject(DestroyRef).onDestroy(() => this.jobs.complete());
  }

  use(id: string): void {
    this.id.set(id);
    this.removed.set(null);
    this.changedMeanwhile.set(false);
  }

  readAgain(): void {
    this.changedMeanwhile.set(false);
    this.source.reload();
  }

  /** Edits the list of lines. @returns why not, or null once it is saved and priced */
  async editLines(edit: LinesEdit): Promise<ProblemError | null> {
    return this.change((quote) =>
      this.api.call(changeQuoteLines, { params: { id: quote.id }, body: { revision: quote.revision, lines: edit(quote.lines) } }),
    );
  }

  /** Removes a line, which can be put back. */
  async remove(line: QuoteLine): Promise<ProblemError | null> {
    const index = this.quote()?.lines.findIndex(({ id }) => id === line.id) ?? -1;
    const problem = await this.editLines(removeLine(line.id));
    if (problem === null && index >= 0) this.removed.set({ line, index });
    return problem;
  }

  /** Puts the line removed last back where it stood. */
  async putBack(): Promise<ProblemError | null> {
    const removed = this.removed();
    if (!removed) return null;
    this.removed.set(null);
    const problem = await this.editLines(putBackLine(removed.line, removed.index));
    if (problem) this.removed.set(removed);
    return problem;
  }

  /** Saves customer, mark-up, notes, validity or ship-to. Agreed prices stay. */
  async saveDetails(details: Details): Promise<ProblemError | null> {
    return this.change((quote) => this.api.call(changeQuote, { params: { id: quote.id }, body: { revision: quote.revision, ...details } }));
  }

  /** Takes today's prices. @param accepted the new total as it was shown */
  async rePrice(accepted: string, validUntil: string | undefined): Promise<ProblemError | null> {
    return this.change((quote) =>
      this.api.call(rePriceQuote, { params: { id: quote.id }, body: { revision: quote.revision, accepted, validUntil } }),
    );
  }

  async mail(mail: BodyOf<typeof mailQuote>): Promise<ProblemError | null> {
    const problem = await this.change((quote) =>
      this.api.call(mailQuote, { params: { id: quote.id }, body: mail, idempotencyKey: this.mailKey.for({ id: quote.id, mail }) }),
    );
    this.mailKey.settle(problem);
    return problem;
  }

  private change(run: Job['run']): Promise<ProblemError | null> {
    this.open.update((count) => count + 1);
    return new Promise((done) => this.jobs.next({ run, done }));
  }

  private work({ run, done }: Job): Observable<unknown> {
    return defer(() => {
      const quote = this.quote();
      if (!quote) throw new ProblemError(0, 'not-here', 'The quote is not here yet. Wait a moment and try again.', [], {});
      return run(quote);
    }).pipe(
      tap((answer) => this.source.set(answer)),
      map(() => null),
      catchError((error: unknown) => of(ProblemError.from(error))),
      tap((problem) => {
        if (problem?.code === 'changed-meanwhile') this.changedMeanwhile.set(true);
        done(problem);
      }),
      finalize(() => this.open.update((count) => count - 1)),
    );
  }
}
