import { DestroyRef, inject, Injectable, signal } from '@angular/core';
import { catchError, EMPTY, exhaustMap, finalize, Subject, tap } from 'rxjs';
import { type BodyOf } from '@shared/contracts/endpoint';
import { type Order, placeOrder } from '@shared/contracts/orders';
import { ApiClient } from '../api-client/api-client';
import { AttemptKey } from '../api-client/attempt-key';
import { ProblemError } from '../api-client/problem-error';

export type OrderAsked = BodyOf<typeof placeOrder>;

/**
 * Places an order, once: while a call is out, further presses do nothing, and when it is not
 * known whether the order arrived, the next press asks for the very same order by its key.
 */
@Injectable()
export class OrderDesk {
  private readonly api = inject(ApiClient);
  private readonly presses = new Subject<{ quote: string; asked: OrderAsked }>();
  private readonly key = new AttemptKey();

  readonly placing = signal(false);
  readonly placed = signal<Order | null>(null);
  readonly problem = signal<ProblemError | null>(null);

  constructor() {
    this.presses.pipe(exhaustMap(({ quote, asked }) => this.send(quote, asked))).subscribe();
    // An order that is on its way is not called back when its page is left.
    inject(DestroyRef).onDestroy(() => this.presses.complete());
  }

  place(quote: string, asked: OrderAsked): void {
    if (this.placed() === null) this.presses.next({ quote, asked });
  }

  private send(quote: string, asked: OrderAsked) {
    this.placing.set(true);
    this.problem.set(null);
    return this.api.call(placeOrder, { params: { id: quote }, body: asked, idempotencyKey: this.key.for({ quote, asked }) }).pipe(
      tap((order) => {
        this.key.settle(null);
        this.placed.set(order);
      }),
      catchError((error: unknown) => {
        const problem = ProblemError.from(error);
        this.key.settle(problem);
        this.problem.set(problem);
        return EMPTY;
      }),
      finalize(() => this.placing.set(false)),
    );
  }
}
