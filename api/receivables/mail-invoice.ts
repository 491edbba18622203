import { type Dependencies } from '../dependencies';
import { newMail } from '../mail/new-mail';
import { type Maker, type OrderRow } from '../orders/order-store';
import { type InvoiceRow } from './invoice-store';

/** Writes the mail that brings an invoice to the dealer's office. Inside the transaction that makes the invoice. */
export function mailInvoice(invoice: InvoiceRow, order: OrderRow, maker: Maker, dependencies: Dependencies): void {
  const { stores } = dependencies;
  const dealer = stores.companies.company(invoice.dealerId);
  if (!dealer) throw new Error(`no company ${invoice.dealerId}`);
  const { amount, currency } = invoice.totals.total;
  const discount =
    invoice.discountPercent && invoice.discountUntil ? [`${invoice.discountPercent} % less if paid by ${invoice.discountUntil}.`] : [];
  stores.outbox.write(
    newMail(dependencies, {
      companyId: maker.id,
      fromName: maker.name,
      replyTo: maker.letterhead.email,
      to: dealer.letterhead.email,
      subject: `Invoice ${invoice.number} for order ${order.number}, your PO ${order.poNumber}`,
      body: [
        `Invoice ${invoice.number} for ${amount} ${currency} is attached.`,
        `It is due on ${invoice.dueOn}.`,
        ...discount,
        `Please pay with the reference ${invoice.reference}.`,
        '',
        maker.name,
      ].join('\n'),
      attachments: [{ kind: 'invoice', id: invoice.id, fileName: `${invoice.number}.pdf` }],
      subjectKind: 'invoice',
      subjectId: invoice.id,
    }),
  );
}
