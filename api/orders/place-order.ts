import { dayIn } from '@shared/calendar/days';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { type OrderState, type placeOrder as placeOrderEndpoint } from '@shared/contracts/orders';
import { Refusal } from '@shared/contracts/problems';
import { amountOf, minorOf } from '@shared/money/money';
import { holds, type Member } from '../companies/actor';
import { type TradeAccountRow } from '../companies/company-store';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { destinationOf } from '../pricing/destination-of';
import { totalsOfQuote } from '../quotes/price-of-quote';
import { checkPlacement } from '../receivables/credit-check';
import { creditStateOf } from '../receivables/read-credit';
import { acknowledgeOrder } from './acknowledge-order';
import { creditReason, creditRefusal } from './credit-refusal';
import { doOnce } from './do-once';
import { documentNumber } from './document-number';
import { demandBuildable, demandSamePrice, openAccount, orderableQuote, shipToOf } from './order-checks';
import { type Maker, type OrderRow } from './order-store';
import { judgeRequiredDay, promisedDay } from './promised-day';
import { readOrder } from './read-order';
import { reservedMinorOf } from './reservation';

type Asked = Input<typeof placeOrderEndpoint>['body'];

/**
 * Orders a quote in one immediate transaction, so that of two callers the second sees what the
 * first wrote: the key, the quote, the price for the ship-to under the version the quote holds,
 * whether the maker can build it, the buyer's limit and the credit are checked, then order,
 * lines with their whole charge sheets, reservation, history, audit row and acknowledgement
 * are written together or not at all. Above the buyer's limit the order waits for the dealer
 * admin; where credit does not reach and `review` is asked for, it waits for the maker's clerk.
 * A waiting order reserves nothing.
 *
 * @throws Refusal `not-found`, `not-in-this-state`, `quote-expired`, `account-not-open`, `card-not-taken`,
 *   `price-changed` with both figures, `cannot-build` with the reasons, `account-on-hold`, `overdue` or
 *   `over-credit` with by how much and what can be done, `key-reused`, or `invalid` at the field
 */
export function placeOrder(
  actor: Member,
  { params, body, idempotencyKey }: Pick<Input<typeof placeOrderEndpoint>, 'params' | 'body' | 'idempotencyKey'>,
  dependencies: Dependencies,
): AnswerOf<typeof placeOrderEndpoint> {
  const call = { endpoint: 'orders.place', key: idempotencyKey, request: { params, body } };
  const id = doOnce(actor, call, dependencies, () => {
    const { stores, clock, newId } = dependencies;
    const quote = orderableQuote(actor, params.id, dependencies);
    const account = openAccount(quote.tradeAccountId, dependencies);
    const maker = stores.orders.maker(quote.fabricatorId);
    // No maker takes cards yet; those that will are told apart here.
    if (body.payment === 'card') throw new Refusal('card-not-taken', `${maker.name} takes no cards. Order on account.`);
    const now = clock();
    const today = dayIn(maker.timeZone, now);
    const shipTo = shipToOf(actor, body.shipTo, dependencies);
    const promisedOn = promisedDay(today, quote.leadTimeClass, maker.calendar);
    demandPossibleDay(body, promisedOn, maker);
    const destination = destinationOf(actor.companyId, shipTo.id, today, stores);
    const lines = stores.quotes.linesOf(quote.id);
    const totals = totalsOfQuote(quote, lines, destination, dependencies);
    demandSamePrice(quote, totals, body.accepted);
    demandBuildable(lines, maker, dependencies);

    const totalMinor = minorOf(totals.total.amount, quote.currency);
    const { state, reason } = startOf(actor, account, totalMinor, today, body, dependencies);
    const order: OrderRow = {
      id: newId(),
      number: documentNumber(maker.numberPrefix, 'order', stores.numbers.next(maker.id, 'order')),
      dealerId: quote.dealerId,
      fabricatorId: quote.fabricatorId,
      tradeAccountId: account.id,
      quoteId: quote.id,
      state,
      poNumber: body.poNumber,
      payment: body.payment,
      currency: quote.currency,
      shipTo,
      destination,
      requiredOn: body.requiredOn ?? null,
      promisedOn,
      priceListVersionId: quote.priceListVersionId,
      totals,
      totalMinor,
      invoicedMinor: 0,
      units: quote.units,
      dispatchedUnits: 0,
      placedAt: now,
      placedBy: actor.personId,
    };
    write(actor, order, account, maker, reason, dependencies);
    return order.id;
  });
  return readOrder(actor, { params: { id } }, dependencies);
}

function demandPossibleDay({ requiredOn }: Asked, earliest: string, maker: Maker): void {
  const wrong = requiredOn === undefined ? null : judgeRequiredDay(requiredOn, earliest, maker.calendar);
  if (wrong) throw new Refusal('invalid', `${maker.name}: ${wrong.detail}.`, [wrong], { earliest });
}

/** Where the order begins, and why there, if not with the maker at once. @throws Refusal when credit does not reach and no review is asked for */
function startOf(
  actor: Member,
  account: TradeAccountRow,
  totalMinor: number,
  today: string,
  { review }: Asked,
  { stores }: Dependencies,
): { state: OrderState; reason: string | null } {
  const { orderLimitMinor } = actor;
  if (orderLimitMinor !== null && totalMinor > orderLimitMinor && !holds(actor, 'dealer-admin')) {
    const limit = `${amountOf(orderLimitMinor, account.currency)} ${account.currency}`;
    return { state: 'awaiting approval', reason: `Above the buyer’s limit of ${limit} for an order’s total.` };
  }
  const answer = checkPlacement(creditStateOf(account, today, { stores }), totalMinor);
  if (answer.ok) return { state: 'submitted', reason: null };
  if (!review) throw creditRefusal(answer, account, ['review']);
  return { state: 'credit review', reason: creditReason(answer) };
}

function write(
  actor: Member,
  order: OrderRow,
  account: TradeAccountRow,
  maker: Maker,
  reason: string | null,
  dependencies: Dependencies,
): void {
  const { stores } = dependencies;
  const { id, state, placedAt: at } = order;
  stores.orders.insert(order);
  stores.orders.copyLinesOfQuote(id, order.quoteId ?? '');
  stores.orders.recordMove({ orderId: id, from: null, to: state, at, personId: actor.personId, reason });
  const reservedMinor = reservedMinorOf(order, account.countsFrom);
  if (reservedMinor !== 0) stores.companies.addToBalances(account.id, { reservedMinor });
  stores.quotes.markOrdered(order.quoteId ?? '', at);
  stores.companies.recordChange({
    companyId: actor.companyId,
    personId: actor.personId,
    at,
    action: 'order placed',
    subjectKind: 'order',
    subjectId: id,
    before: null,
    after: { number: order.number, state, totalMinor: order.totalMinor, currency: order.currency },
    reason: null,
  });
  if (state === 'submitted') acknowledgeOrder(order, maker, dependencies);
}
