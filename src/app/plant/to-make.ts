import { computed, inject, Injectable, signal } from '@angular/core';
import { listOrders, type OrderItem } from '@shared/contracts/orders';
import { ApiClient } from '../api-client/api-client';
import { pagedList } from '../api-client/paged-list';

/** States of orders that are the plant's to work on. */
export const plantStates = ['accepted', 'in production', 'ready'] as const;
export type PlantState = (typeof plantStates)[number];

/** Orders that are to be made or to leave, those promised first at the top. */
@Injectable()
export class ToMake {
  private readonly api = inject(ApiClient);
  private readonly lists = Object.fromEntries(
    plantStates.map((state) => [
      state,
      pagedList(signal({ state, limit: 200 }).asReadonly(), (query) => this.api.call(listOrders, { query })),
    ]),
  ) as Record<PlantState, ReturnType<typeof pagedList<{ state: PlantState; limit: number }, OrderItem>>>;
  private readonly all = plantStates.map((state) => this.lists[state]);

  readonly orders = computed(() => this.all.flatMap(({ items }) => items()).sort(byPromise));
  readonly counts = computed(() =>
    plantStates.map((state) => {
      const { items, hasMore } = this.lists[state];
      return { state, count: `${items().length}${hasMore() ? '+' : ''}`, units: items().reduce((sum, order) => sum + unitsLeft(order), 0) };
    }),
  );
  readonly loading = computed(() => this.all.some(({ loading }) => loading()));
  readonly hasMore = computed(() => this.all.some(({ hasMore }) => hasMore()));
  readonly problem = computed(() => this.all.map(({ problem }) => problem()).find((problem) => problem !== null) ?? null);

  more(): void {
    for (const list of this.all) list.more();
  }

  reload(): void {
    for (const list of this.all) list.reload();
  }
}

/** Units of an order that have not left yet. */
export function unitsLeft({ units, dispatchedUnits }: Pick<OrderItem, 'units' | 'dispatchedUnits'>): number {
  return units - dispatchedUnits;
}

/** By promised day, those without one last; then by when they were placed. */
export function byPromise(a: OrderItem, b: OrderItem): number {
  const [one, other] = [a.promisedOn ?? '9999', b.promisedOn ?? '9999'];
  if (one !== other) return one < other ? -1 : 1;
  return a.placedAt < b.placedAt ? -1 : a.placedAt > b.placedAt ? 1 : 0;
}
