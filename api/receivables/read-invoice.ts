import { dayIn } from '@shared/calendar/days';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { Refusal } from '@shared/contracts/problems';
import { type readInvoice as readInvoiceEndpoint } from '@shared/contracts/receivables';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { wholeDiscountMinor } from './discount';
import { allocationOnWire, entryOnWire, invoiceOnWire } from './on-wire';

/** One invoice of one's own company; its ledger entries for the fabricator's clerk alone. */
export function readInvoice(
  actor: Member,
  { params }: Pick<Input<typeof readInvoiceEndpoint>, 'params'>,
  { stores, clock }: Pick<Dependencies, 'stores' | 'clock'>,
): AnswerOf<typeof readInvoiceEndpoint> {
  const isDealer = actor.companyKind === 'dealer';
  const found = stores.invoices.read(actor.companyId, params.id);
  if (!found) throw new Refusal('not-found', 'There is no such invoice of yours.');
  const { invoice } = found;
  const amount = (minor: number) => money(minor, invoice.currency);
  const applied = stores.receipts.allocationsOfInvoice(invoice.id);
  return {
    ...invoiceOnWire({ ...invoice, dealerName: found.dealerName, fabricatorName: found.fabricatorName }, dayIn(actor.timeZone, clock())),
    order: { id: invoice.orderId, number: found.orderNumber, poNumber: found.poNumber },
    dispatch: { id: invoice.dispatchId, number: found.dispatchNumber },
    discount:
      invoice.discountPercent !== null && invoice.discountUntil !== null
        ? { percent: invoice.discountPercent, until: invoice.discountUntil, amount: amount(wholeDiscountMinor(invoice)) }
        : null,
    lines: invoice.lines.map(({ unitPriceMinor, linePriceMinor, ...line }) => ({
      ...line,
      unitPrice: amount(unitPriceMinor),
      linePrice: amount(linePriceMinor),
    })),
    goods: invoice.totals.goods,
    orderCharges: invoice.totals.orderCharges,
    tax: invoice.totals.tax,
    allocations: applied.map(allocationOnWire),
    entries: isDealer
      ? []
      : [
          ...stores.ledger.entriesOf('invoice', [invoice.id]),
          ...stores.ledger.entriesOf(
            'allocation',
            applied.map(({ allocation }) => allocation.id),
          ),
        ].map(entryOnWire),
  };
}
