import { inject, Injectable } from '@angular/core';
import { type BodyOf } from '@shared/contracts/endpoint';
import { placeOrder } from '@shared/contracts/orders';
import { ApiClient } from '../api-client/api-client';
import { singleFlight } from '../api-client/single-flight';

export type OrderAsked = BodyOf<typeof placeOrder>;

/** Places an order from a quote, once. */
@Injectable()
export class OrderDesk {
  private readonly api = inject(ApiClient);
  private readonly flight = singleFlight(({ quote, asked }: { quote: string; asked: OrderAsked }, idempotencyKey) =>
    this.api.call(placeOrder, { params: { id: quote }, body: asked, idempotencyKey }),
  );

  readonly placing = this.flight.flying;
  readonly placed = this.flight.answer;
  readonly problem = this.flight.problem;

  /** Does nothing while an order is on its way, nor once it is placed. */
  place(quote: string, asked: OrderAsked): void {
    if (this.placed() === null) this.flight.press({ quote, asked });
  }
}
