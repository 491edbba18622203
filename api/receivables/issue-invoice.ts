import { dayIn } from '@shared/calendar/days';
import { dueDates } from '@shared/calendar/terms';
import { type Terms } from '@shared/contracts/trade-accounts';
import { minorOf } from '@shared/money/money';
import { formatLengthNumber } from '@shared/measures/format-length';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { documentNumber } from '../orders/document-number';
import { type OrderLineRow, type OrderRow } from '../orders/order-store';
import { invoicePart } from './invoice-part';
import { type InvoiceRow } from './invoice-store';
import { invoiceIssued } from './ledger-events';
import { mailInvoice } from './mail-invoice';
import { postEntry } from './post-entry';
import { creditorReference } from './reference';

/** What leaves now of an order, and what the invoice for it stands on. */
export interface Dispatched {
  dispatchId: string;
  order: OrderRow;
  /** every line of the order as it was before this dispatch, with the quantity that leaves now */
  lines: readonly (OrderLineRow & { now: number })[];
  terms: Terms;
}

/**
 * Makes the invoice for what is dispatched: the next number of the fabricator, an ISO 11649
 * reference, due and discount day from the terms, totals so that the invoices of an order sum
 * to the order, the ledger entry and the mail. Runs inside the transaction of the dispatch.
 */
export function issueInvoice(actor: Member, { dispatchId, order, lines, terms }: Dispatched, dependencies: Dependencies): InvoiceRow {
  const { stores, clock, newId } = dependencies;
  const { currency, fabricatorId } = order;
  const maker = stores.orders.maker(fabricatorId);
  const at = clock();
  const issuedOn = dayIn(maker.timeZone, at);
  const sum = (value: (line: OrderLineRow & { now: number }) => number) => lines.reduce((total, line) => total + value(line), 0);
  const goodsMinor = sum((line) => line.unitPriceMinor * line.now);
  const totals = invoicePart({
    order: order.totals,
    earlier: stores.invoices.ofOrder(order.id).map((invoice) => invoice.totals),
    goodsMinor,
    laterGoodsMinor: sum((line) => line.unitPriceMinor * (line.quantity - line.dispatched - line.now)),
    units: sum((line) => line.now),
    laterUnits: sum((line) => line.quantity - line.dispatched - line.now),
    taxScopes: stores.priceLists
      .version(order.priceListVersionId)
      .content.tax.filter(({ jurisdiction }) => jurisdiction === order.destination.jurisdiction),
    currency,
  });
  const sequence = stores.numbers.next(fabricatorId, 'invoice');
  const number = documentNumber(maker.numberPrefix, 'invoice', sequence);
  const { dueOn, discountUntil } = dueDates(issuedOn, terms);
  const totalMinor = minorOf(totals.total.amount, currency);
  const invoice: InvoiceRow = {
    id: newId(),
    number,
    sequence,
    reference: creditorReference(number),
    fabricatorId,
    dealerId: order.dealerId,
    tradeAccountId: order.tradeAccountId,
    orderId: order.id,
    dispatchId,
    issuedOn,
    issuedAt: at,
    dueOn,
    discountPercent: discountUntil === null ? null : terms.discountPercent,
    discountUntil,
    currency,
    lines: lines
      .filter((line) => line.now > 0)
      .map((line, i) => ({
        position: i + 1,
        tag: line.tag,
        description: `${line.makeUp}, ${sizeOf(line, maker.measureSystem)}`,
        quantity: line.now,
        unitPriceMinor: line.unitPriceMinor,
        linePriceMinor: line.unitPriceMinor * line.now,
      })),
    totals,
    totalMinor,
    openMinor: totalMinor,
  };
  stores.invoices.insert(invoice);
  const taxMinor = totals.tax.reduce((all, { amount }) => all + minorOf(amount.amount, currency), 0);
  postEntry(
    { stores, newId, fabricatorId, tradeAccountId: order.tradeAccountId, currency, on: issuedOn, at, personId: actor.personId },
    invoiceIssued({ id: invoice.id, number, goodsMinor, taxMinor, chargesMinor: totalMinor - goodsMinor - taxMinor }),
  );
  mailInvoice(invoice, order, maker, dependencies);
  return invoice;
}

/** Width × height as the maker writes sizes. */
function sizeOf({ unit }: OrderLineRow, measure: 'imperial' | 'metric'): string {
  return `${formatLengthNumber(unit.width, measure)} × ${formatLengthNumber(unit.height, measure)} ${measure === 'imperial' ? 'in' : 'mm'}`;
}
