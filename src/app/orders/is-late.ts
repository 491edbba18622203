import { type OrderItem, type OrderState } from '@shared/contracts/orders';

/** States in which units are still to leave the plant. */
const stillToLeave: readonly OrderState[] = ['submitted', 'accepted', 'in production', 'ready'];

/** Whether the promised day is past and units have not left. @param today a day of the reader's */
export function isLate({ state, promisedOn }: Pick<OrderItem, 'state' | 'promisedOn'>, today: string): boolean {
  return promisedOn !== null && promisedOn < today && stillToLeave.includes(state);
}
