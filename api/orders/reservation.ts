import { type OrderState } from '@shared/contracts/orders';

/** States in which an order on account binds credit with what is not yet invoiced. */
export const reservingStates = ['submitted', 'accepted', 'in production', 'ready'] as const satisfies readonly OrderState[];

export interface Reserving {
  state: OrderState;
  payment: 'account' | 'card';
  totalMinor: number;
  invoicedMinor: number;
}

/**
 * What one order binds of the credit of its account, in minor units: what is placed and not
 * yet invoiced, with tax and delivery; nothing where the account counts orders from dispatch.
 */
export function reservedMinorOf(order: Reserving, countsFrom: 'placement' | 'dispatch'): number {
  if (countsFrom === 'dispatch' || order.payment !== 'account') return 0;
  return (reservingStates as readonly OrderState[]).includes(order.state) ? order.totalMinor - order.invoicedMinor : 0;
}
