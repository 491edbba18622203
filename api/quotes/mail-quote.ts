import { type mailQuote as mailQuoteEndpoint, type Quote } from '@shared/contracts/quotes';
import { Refusal } from '@shared/contracts/problems';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { newMail } from '../mail/new-mail';
import { doOnce } from '../orders/do-once';
import { findQuote } from './quote-life';
import { readQuote } from './read-quote';

/**
 * Mails the quote as PDF to the dealer's customer in the dealer's name; answers come to the
 * person who sent it. The same key again sends nothing more.
 *
 * @throws Refusal `not-found`, `not-in-this-state` for a quote without lines, or `key-reused`
 */
export function mailQuote(
  actor: Member,
  { params, body, idempotencyKey }: Pick<Input<typeof mailQuoteEndpoint>, 'params' | 'body' | 'idempotencyKey'>,
  dependencies: Dependencies,
): Quote {
  const { stores } = dependencies;
  doOnce(actor, { endpoint: 'quotes.mail', key: idempotencyKey, request: { params, body } }, dependencies, () => {
    const quote = findQuote(actor, params.id, stores);
    if (quote.units === 0) throw new Refusal('not-in-this-state', `${quote.number} has no lines.`);
    stores.outbox.write(
      newMail(dependencies, {
        companyId: actor.companyId,
        fromName: actor.companyName,
        replyTo: actor.email,
        to: body.to,
        subject: body.subject,
        body: body.message,
        attachments: [{ kind: 'quote', id: quote.id, prices: body.prices, fileName: `${quote.number}.pdf` }],
        subjectKind: 'quote',
        subjectId: quote.id,
      }),
    );
    return quote.id;
  });
  return readQuote(actor, { params }, dependencies);
}
