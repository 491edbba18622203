import { type quotePdf as quotePdfEndpoint } from '@shared/contracts/quotes';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { renderQuotePdf } from '../documents/render-quote-pdf';
import { type FileAnswer, type Input } from '../http/serve';
import { quoteDocument } from './quote-document';
import { findQuote } from './quote-life';

/** A quote of the caller's own company as PDF, wholesale or retail. @throws Refusal `not-found` */
export async function quotePdf(
  actor: Member,
  { params, query }: Pick<Input<typeof quotePdfEndpoint>, 'params' | 'query'>,
  dependencies: Pick<Dependencies, 'stores' | 'catalogue'>,
): Promise<FileAnswer> {
  const quote = findQuote(actor, params.id, dependencies.stores);
  return { fileName: `${quote.number}.pdf`, bytes: await renderQuotePdf(quoteDocument(quote, query.prices, dependencies)) };
}
