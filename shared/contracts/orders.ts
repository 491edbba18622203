import * as z from 'zod';
import { endpoint } from './endpoint';
import { currency, day, id, instant, line, moneySchema, named, pageOf, pageQuery } from './primitives';
import { pricedLine, totalsSchema } from './prices';
import { addressSchema } from './trade-accounts';
import { unitSchema } from './units';

/** Orders: from a quote to the door. */

export const orderStates = [
  'awaiting approval',
  'credit review',
  'awaiting payment',
  'submitted',
  'accepted',
  'in production',
  'ready',
  'dispatched',
  'delivered',
  'closed',
  'cancelled',
  'refused',
] as const;
export const orderState = z.enum(orderStates);
export type OrderState = z.infer<typeof orderState>;

export const orderLine = pricedLine.omit({ hints: true }).extend({
  id,
  position: z.int(),
  tag: z.string().nullable(),
  unit: unitSchema,
  makeUp: z.string(),
  quantity: z.int(),
  dispatched: z.int(),
});
export type OrderLine = z.infer<typeof orderLine>;

const orderHead = {
  id,
  number: z.string(),
  state: orderState,
  dealer: named,
  fabricator: named,
  tradeAccount: id,
  poNumber: z.string(),
  currency,
  units: z.int(),
  dispatchedUnits: z.int(),
  total: moneySchema,
  placedAt: instant,
  requiredOn: day.nullable(),
  promisedOn: day.nullable(),
};

export const orderItem = z.object(orderHead).meta({ id: 'OrderItem' });
export type OrderItem = z.infer<typeof orderItem>;

/** A move the reader may make now. */
export const openMove = z.object({ to: orderState, label: z.string(), needsReason: z.boolean() });

export const orderSchema = z
  .object({
    ...orderHead,
    payment: z.enum(['account', 'card']),
    placedBy: z.string(),
    shipTo: addressSchema.omit({ exempt: true }),
    quote: id.nullable().meta({ description: 'seen by the dealer alone' }),
    priceListVersion: id,
    priceList: z.object({ name: z.string(), effectiveFrom: instant }),
    lines: z.array(orderLine),
    ...totalsSchema.shape,
    history: z.array(z.object({ from: orderState.nullable(), to: orderState, at: instant, by: z.string(), reason: z.string().nullable() })),
    dispatches: z.array(
      z.object({
        id,
        number: z.string(),
        at: instant,
        by: z.string(),
        lines: z.array(z.object({ line: id, quantity: z.int() })),
        invoice: z.object({ id, number: z.string() }).nullable().meta({ description: 'null for readers who do not see invoices' }),
      }),
    ),
    moves: z.array(openMove),
    canDispatch: z.boolean(),
  })
  .meta({ id: 'Order' });
export type Order = z.infer<typeof orderSchema>;

export const placeOrder = endpoint({
  id: 'orders.place',
  method: 'POST',
  path: '/api/quotes/:id/order',
  summary: 'Order a quote: price, buildability and credit are checked again in the same transaction',
  params: z.object({ id }),
  body: z.strictObject({
    poNumber: line(60),
    shipTo: id,
    requiredOn: day.optional(),
    payment: z.enum(['account', 'card']),
    /** The total as shown; a difference is refused with both figures. */
    accepted: z.string().optional(),
    /** Ask for credit review where credit does not reach, instead of a refusal. */
    review: z.boolean().optional(),
  }),
  status: 201,
  answer: orderSchema,
  idempotent: true,
});

export const listOrders = endpoint({
  id: 'orders.list',
  method: 'GET',
  path: '/api/orders',
  summary: 'Orders of one’s own company, newest first; with q, those whose number, then those whose PO number begins with it, last first',
  query: pageQuery.extend({ state: orderState.optional(), q: z.string().max(60).optional(), dealer: id.optional() }),
  status: 200,
  answer: pageOf(orderItem),
});

export const readOrder = endpoint({
  id: 'orders.read',
  method: 'GET',
  path: '/api/orders/:id',
  summary: 'One order',
  params: z.object({ id }),
  status: 200,
  answer: orderSchema,
});

export const moveOrder = endpoint({
  id: 'orders.move',
  method: 'POST',
  path: '/api/orders/:id/moves',
  summary: 'Move an order on; any move outside the table is a 409',
  params: z.object({ id }),
  body: z.strictObject({ to: orderState, reason: line(300).optional() }),
  status: 200,
  answer: orderSchema,
});

export const dispatchOrder = endpoint({
  id: 'orders.dispatch',
  method: 'POST',
  path: '/api/orders/:id/dispatches',
  summary: 'Dispatch all or a part by line quantity; makes the invoice and posts it',
  params: z.object({ id }),
  body: z.strictObject({
    lines: z
      .array(z.strictObject({ line: id, quantity: z.int().min(1).max(10_000) }))
      .min(1)
      .max(500),
  }),
  status: 201,
  answer: orderSchema,
  idempotent: true,
});

export const orderPdf = endpoint({
  id: 'orders.pdf',
  method: 'GET',
  path: '/api/orders/:id/pdf',
  summary: 'The acknowledgement as PDF with drawings',
  params: z.object({ id }),
  status: 200,
  file: 'application/pdf',
});
