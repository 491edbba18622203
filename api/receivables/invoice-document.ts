import { daysBetween } from '@shared/calendar/days';
import { termsText } from '@shared/calendar/terms';
import { Refusal } from '@shared/contracts/problems';
import { type invoicePdf as invoicePdfEndpoint } from '@shared/contracts/receivables';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { type Dependencies, type Stores } from '../dependencies';
import { type InvoiceDocument } from '../documents/document-models';
import { renderInvoicePdf } from '../documents/render-invoice-pdf';
import { type FileAnswer, type Input } from '../http/serve';
import { shipToParty } from '../orders/order-document';
import { wholeDiscountMinor } from './discount';

type ReadInvoiceRow = NonNullable<ReturnType<Stores['invoices']['read']>>;

/** The invoice as PDF, for either side of it. @throws Refusal `not-found` */
export async function invoicePdf(
  actor: Member,
  { params }: Pick<Input<typeof invoicePdfEndpoint>, 'params'>,
  dependencies: Dependencies,
): Promise<FileAnswer> {
  const found = dependencies.stores.invoices.read(actor.companyId, params.id);
  if (!found) throw new Refusal('not-found', 'There is no such invoice of yours.');
  return { fileName: `${found.invoice.number}.pdf`, bytes: await renderInvoicePdf(invoiceDocument(found, dependencies)) };
}

/** An invoice as its document says it, in the maker's name. Days and discount are those it was issued with, whatever the terms are now. */
export function invoiceDocument(found: ReadInvoiceRow, { stores }: Pick<Dependencies, 'stores'>): InvoiceDocument {
  const { invoice, shipTo } = found;
  const { currency, issuedOn, dueOn, discountPercent, discountUntil } = invoice;
  const maker = stores.orders.maker(invoice.fabricatorId);
  const { lines, email, phone, registration } = maker.letterhead;
  const discountDays = discountUntil === null ? null : daysBetween(issuedOn, discountUntil);
  return {
    sender: { name: maker.name, lines, email, phone },
    number: invoice.number,
    at: invoice.issuedAt,
    locale: maker.locale,
    timeZone: maker.timeZone,
    measureSystem: maker.measureSystem,
    dealer: { name: found.dealerName, lines: stores.companies.company(invoice.dealerId)?.letterhead.lines ?? [] },
    shipTo: shipToParty(shipTo),
    issuedOn,
    dueOn,
    terms: termsText({ netDays: daysBetween(issuedOn, dueOn), endOfMonth: false, discountPercent, discountDays }),
    discount:
      discountPercent !== null && discountUntil !== null
        ? { percent: discountPercent, until: discountUntil, amount: money(wholeDiscountMinor(invoice), currency) }
        : null,
    reference: invoice.reference,
    bankDetails: registration === '' ? [] : [registration],
    orderNumber: found.orderNumber,
    poNumber: found.poNumber,
    dispatchNumber: found.dispatchNumber,
    lines: invoice.lines.map(({ position, tag, description, quantity, unitPriceMinor, linePriceMinor }) => ({
      position,
      tag,
      description,
      quantity,
      unitPrice: money(unitPriceMinor, currency),
      linePrice: money(linePriceMinor, currency),
    })),
    totals: invoice.totals,
  };
}
