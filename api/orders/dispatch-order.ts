import { type AnswerOf } from '@shared/contracts/endpoint';
import { type dispatchOrder as dispatchOrderEndpoint } from '@shared/contracts/orders';
import { type FieldError, pointer, Refusal } from '@shared/contracts/problems';
import { dayIn } from '@shared/calendar/days';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { checkDispatch } from '../receivables/credit-check';
import { issueInvoice } from '../receivables/issue-invoice';
import { creditStateOf } from '../receivables/read-credit';
import { creditRefusal } from './credit-refusal';
import { doOnce } from './do-once';
import { documentNumber } from './document-number';
import { accountOf } from './order-checks';
import { canDispatchIn } from './order-life';
import { type OrderLineRow } from './order-store';
import { readOrder } from './read-order';
import { reservedMinorOf } from './reservation';

type Asked = Input<typeof dispatchOrderEndpoint>['body']['lines'];

/**
 * Sends out all or a part of an order: the dispatch with its lines, the invoice with its ledger
 * entry and mail, and the credit that turns from reserved into receivable, in one transaction.
 * The order becomes dispatched with its last unit. Where the account counts from dispatch, the
 * invoice has to find room within the limit.
 *
 * @throws Refusal `not-found`, `not-in-this-state`, `over-credit`, `key-reused`, or `invalid` at the line that is unknown or asks too much
 */
export function dispatchOrder(
  actor: Member,
  { params, body, idempotencyKey }: Pick<Input<typeof dispatchOrderEndpoint>, 'params' | 'body' | 'idempotencyKey'>,
  dependencies: Dependencies,
): AnswerOf<typeof dispatchOrderEndpoint> {
  const { stores, clock, newId } = dependencies;
  const call = { endpoint: 'orders.dispatch', key: idempotencyKey, request: { params, body } };
  const id = doOnce(actor, call, dependencies, () => {
    const order = stores.orders.read(actor.companyId, params.id)?.order;
    if (!order) throw new Refusal('not-found', 'There is no such order of yours.');
    if (!canDispatchIn(order.state))
      throw new Refusal('not-in-this-state', `Nothing can be dispatched of an order that is ${order.state}.`);
    const lines = quantitiesNow(stores.orders.linesOf(order.id), body.lines);
    const account = accountOf(order.tradeAccountId, dependencies);
    const maker = stores.orders.maker(order.fabricatorId);

    const credit = creditStateOf(account, dayIn(maker.timeZone, clock()), { stores });
    const dispatchId = newId();
    const number = documentNumber(maker.numberPrefix, 'dispatch', stores.numbers.next(maker.id, 'dispatch'));
    stores.orders.insertDispatch(
      { id: dispatchId, orderId: order.id, number, at: clock(), personId: actor.personId },
      lines.filter(({ now }) => now > 0).map((line) => ({ orderLineId: line.id, quantity: line.now })),
    );
    const invoice = issueInvoice(actor, { dispatchId, order, lines, terms: account.terms }, dependencies);
    const answer = checkDispatch(credit, invoice.totalMinor);
    if (!answer.ok) throw creditRefusal(answer, account, []);

    const dispatchedUnits = order.dispatchedUnits + lines.reduce((sum, { now }) => sum + now, 0);
    const state = dispatchedUnits === order.units ? ('dispatched' as const) : order.state;
    const after = { ...order, state, dispatchedUnits, invoicedMinor: order.invoicedMinor + invoice.totalMinor };
    stores.orders.save(after);
    if (state !== order.state) {
      stores.orders.recordMove({ orderId: order.id, from: order.state, to: state, at: clock(), personId: actor.personId, reason: null });
    }
    const reservedMinor = reservedMinorOf(after, account.countsFrom) - reservedMinorOf(order, account.countsFrom);
    if (reservedMinor !== 0) stores.companies.addToBalances(account.id, { reservedMinor });
    return order.id;
  });
  return readOrder(actor, { params: { id } }, dependencies);
}

/** The order's lines with what leaves now. @throws Refusal `invalid` at the line that is unknown, named twice or asks too much */
function quantitiesNow(lines: readonly OrderLineRow[], asked: Asked): (OrderLineRow & { now: number })[] {
  const now = new Map<string, number>();
  const errors: FieldError[] = [];
  for (const [i, { line: id, quantity }] of asked.entries()) {
    const line = lines.find((known) => known.id === id);
    const left = line ? line.quantity - line.dispatched : 0;
    if (!line) errors.push({ pointer: pointer('lines', i, 'line'), detail: 'is no line of this order' });
    else if (now.has(id)) errors.push({ pointer: pointer('lines', i, 'line'), detail: 'is named twice' });
    else if (quantity > left) errors.push({ pointer: pointer('lines', i, 'quantity'), detail: `only ${left} are left to dispatch` });
    now.set(id, quantity);
  }
  if (errors.length > 0) throw new Refusal('invalid', errors.map(({ detail }) => detail).join('; '), errors);
  return lines.map((line) => ({ ...line, now: now.get(line.id) ?? 0 }));
}
