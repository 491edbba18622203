import { type Dependencies } from '../dependencies';
import { newMail } from '../mail/new-mail';
import { type Maker, type OrderRow } from './order-store';

/**
 * Writes the mail that acknowledges an order to the person who placed it, with the
 * acknowledgement as PDF. Written when the order reaches the maker: at once, or when it is
 * approved or released. Inside the transaction that moves it there.
 */
export function acknowledgeOrder(order: OrderRow, maker: Maker, dependencies: Dependencies): void {
  const { stores } = dependencies;
  const { amount, currency } = order.totals.total;
  const buyer = stores.people.user(order.placedBy);
  stores.outbox.write(
    newMail(dependencies, {
      companyId: maker.id,
      fromName: maker.name,
      replyTo: maker.letterhead.email,
      to: buyer.email,
      subject: `Order ${order.number}, your PO ${order.poNumber}`,
      body: [
        `Thank you for your order ${order.number} (your PO ${order.poNumber}) of ${order.units} units, ${amount} ${currency}.`,
        ...(order.promisedOn ? [`We expect to have it ready by ${order.promisedOn}.`] : []),
        ...(order.requiredOn ? [`You asked for it by ${order.requiredOn}.`] : []),
        'The acknowledgement is attached; please check sizes and make-ups against your own.',
        '',
        maker.name,
      ].join('\n'),
      attachments: [{ kind: 'order', id: order.id, fileName: `${order.number}.pdf` }],
      subjectKind: 'order',
      subjectId: order.id,
    }),
  );
}
