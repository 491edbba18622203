import { type AnswerOf } from '@shared/contracts/endpoint';
import { mayCall } from '@shared/contracts/who-may-call';
import { type Order, type readOrder as readOrderEndpoint } from '@shared/contracts/orders';
import { Refusal } from '@shared/contracts/problems';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { type Dependencies, type Stores } from '../dependencies';
import { type Input } from '../http/serve';
import { mayDispatch, movesOpenTo } from './order-life';
import { type OrderLineRow, type ReadOrderRow } from './order-store';

/**
 * One order, as its reader may see it: the quote for the dealer alone, invoices for those who
 * read invoices, and the moves this reader may make now.
 *
 * @throws Refusal `not-found` unless the reader's company is a party of the order
 */
export function readOrder(
  actor: Member,
  { params }: Pick<Input<typeof readOrderEndpoint>, 'params'>,
  { stores }: Pick<Dependencies, 'stores'>,
): AnswerOf<typeof readOrderEndpoint> {
  const found = stores.orders.read(actor.companyId, params.id);
  if (!found) throw new Refusal('not-found', 'There is no such order of yours.');
  return orderFor(actor, found, stores);
}

function orderFor(actor: Member, row: ReadOrderRow, stores: Stores): Order {
  const { order } = row;
  const list = stores.priceLists.version(order.priceListVersionId);
  const seesInvoices = mayCall('invoices.read', actor.roles);
  return {
    id: order.id,
    number: order.number,
    state: order.state,
    dealer: { id: order.dealerId, name: row.dealerName },
    fabricator: { id: order.fabricatorId, name: row.fabricatorName },
    tradeAccount: order.tradeAccountId,
    poNumber: order.poNumber,
    currency: order.currency,
    units: order.units,
    dispatchedUnits: order.dispatchedUnits,
    placedAt: isoInstant(order.placedAt),
    requiredOn: order.requiredOn,
    promisedOn: order.promisedOn,
    payment: order.payment,
    placedBy: row.placedByName,
    shipTo: order.shipTo,
    quote: actor.companyId === order.dealerId ? order.quoteId : null,
    priceListVersion: order.priceListVersionId,
    priceList: { name: list.name, effectiveFrom: list.effectiveFrom },
    lines: stores.orders.linesOf(order.id).map((line) => lineOnWire(line, order.currency)),
    ...order.totals,
    history: stores.orders.movesOf(order.id).map(({ move, byName }) => ({
      from: move.from,
      to: move.to,
      at: isoInstant(move.at),
      by: byName ?? '',
      reason: move.reason,
    })),
    dispatches: stores.orders.dispatchesOf(order.id).map(({ dispatch, byName, invoiceId, invoiceNumber, lines }) => ({
      id: dispatch.id,
      number: dispatch.number,
      at: isoInstant(dispatch.at),
      by: byName,
      lines: lines.map(({ orderLineId, quantity }) => ({ line: orderLineId, quantity })),
      invoice: seesInvoices && invoiceId && invoiceNumber ? { id: invoiceId, number: invoiceNumber } : null,
    })),
    moves: movesOpenTo(order, actor.roles).map(({ to, label, needsReason }) => ({ to, label, needsReason })),
    canDispatch: mayDispatch(order, actor.roles),
  };
}

const isoInstant = (at: number) => new Date(at).toISOString();

function lineOnWire(line: OrderLineRow, currency: Order['currency']): Order['lines'][number] {
  return {
    id: line.id,
    position: line.position,
    tag: line.tag,
    unit: line.unit,
    makeUp: line.makeUp,
    quantity: line.quantity,
    dispatched: line.dispatched,
    unitPrice: money(line.unitPriceMinor, currency),
    linePrice: money(line.linePriceMinor, currency),
    charges: line.sheet.charges,
  };
}
