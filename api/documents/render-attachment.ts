import { type MailAttachment } from '../database/schema/mail';
import { type Dependencies } from '../dependencies';
import { orderDocument } from '../orders/order-document';
import { quoteDocument } from '../quotes/quote-document';
import { invoiceDocument } from '../receivables/invoice-document';
import { renderAcknowledgementPdf } from './render-acknowledgement-pdf';
import { renderInvoicePdf } from './render-invoice-pdf';
import { renderQuotePdf } from './render-quote-pdf';

/** Makes a mail's document when the mail is sent. @throws Error when the company has no such document */
export async function renderAttachment(
  { kind, id, prices }: MailAttachment,
  companyId: string,
  dependencies: Pick<Dependencies, 'stores' | 'catalogue'>,
): Promise<Uint8Array> {
  const { stores } = dependencies;
  const found = <T>(document: T | undefined): T => {
    if (document === undefined) throw new Error(`${companyId} has no ${kind} ${id}`);
    return document;
  };
  switch (kind) {
    case 'quote':
      return renderQuotePdf(quoteDocument(found(stores.quotes.find(companyId, id)), prices ?? 'retail', dependencies));
    case 'order':
      return renderAcknowledgementPdf(orderDocument(found(stores.orders.read(companyId, id)), dependencies));
    case 'invoice':
      return renderInvoicePdf(invoiceDocument(found(stores.invoices.read(companyId, id)), dependencies));
  }
}
