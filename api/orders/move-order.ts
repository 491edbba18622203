import { dayIn } from '@shared/calendar/days';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { type moveOrder as moveOrderEndpoint, type OrderState } from '@shared/contracts/orders';
import { Refusal } from '@shared/contracts/problems';
import { type Member } from '../companies/actor';
import { type TradeAccountRow } from '../companies/company-store';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { checkPlacement } from '../receivables/credit-check';
import { creditStateOf } from '../receivables/read-credit';
import { acknowledgeOrder } from './acknowledge-order';
import { creditReason } from './credit-refusal';
import { accountOf, openAccount } from './order-checks';
import { judgeMove } from './order-life';
import { type OrderRow, type ReadOrderRow } from './order-store';
import { promisedDay } from './promised-day';
import { readOrder } from './read-order';
import { reservedMinorOf } from './reservation';

/**
 * Moves an order on by the table of allowed moves, in one transaction: the state, the history,
 * what the order reserves of the credit, and the acknowledgement where it reaches the maker now.
 * An approval checks credit and puts the order into credit review where it does not reach.
 *
 * @throws Refusal `not-found`, `not-in-this-state`, `not-allowed`, `account-not-open` where it would reach the maker, or `invalid` without the reason that the move needs
 */
export function moveOrder(
  actor: Member,
  { params, body }: Pick<Input<typeof moveOrderEndpoint>, 'params' | 'body'>,
  dependencies: Dependencies,
): AnswerOf<typeof moveOrderEndpoint> {
  const { stores, database } = dependencies;
  database.immediately(() => {
    const found = stores.orders.read(actor.companyId, params.id);
    if (!found) throw new Refusal('not-found', 'There is no such order of yours.');
    const { order } = found;
    const move = judgeMove(order, body.to, body.reason, actor.roles);
    if (move instanceof Refusal) throw move;
    const account =
      move.to === 'submitted' ? openAccount(order.tradeAccountId, dependencies) : accountOf(order.tradeAccountId, dependencies);
    const short = move.credit === 'check' ? creditShortage(order, account, dependencies) : null;
    if (short) writeMove(actor, found, account, 'credit review', short, dependencies);
    else writeMove(actor, found, account, move.to, body.reason ?? null, dependencies);
  });
  return readOrder(actor, { params }, dependencies);
}

/** Why the order's credit does not reach now; null when it does. */
function creditShortage(order: OrderRow, account: TradeAccountRow, { stores, clock }: Dependencies): string | null {
  const today = dayIn(stores.orders.maker(order.fabricatorId).timeZone, clock());
  const answer = checkPlacement(creditStateOf(account, today, { stores }), order.totalMinor);
  return answer.ok ? null : creditReason(answer);
}

function writeMove(
  actor: Member,
  { order, leadTimeClass }: ReadOrderRow,
  account: TradeAccountRow,
  to: OrderState,
  reason: string | null,
  dependencies: Dependencies,
): void {
  const { stores, clock } = dependencies;
  const moved = { ...order, state: to };
  if (to === 'submitted') {
    const maker = stores.orders.maker(order.fabricatorId);
    moved.promisedOn = promisedDay(dayIn(maker.timeZone, clock()), leadTimeClass, maker.calendar);
    acknowledgeOrder(moved, maker, dependencies);
  }
  stores.orders.save(moved);
  stores.orders.recordMove({ orderId: order.id, from: order.state, to, at: clock(), personId: actor.personId, reason });
  const reservedMinor = reservedMinorOf(moved, account.countsFrom) - reservedMinorOf(order, account.countsFrom);
  if (reservedMinor !== 0) stores.companies.addToBalances(account.id, { reservedMinor });
}
