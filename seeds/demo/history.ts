import { addDays, addWorkingDays, dayIn, daysBetween, isWorkingDay } from '@shared/calendar/days';
import { type Order } from '@shared/contracts/orders';
import { Refusal } from '@shared/contracts/problems';
import { amountOf, minorOf, percentOf } from '@shared/money/money';
import { exact } from '@shared/money/exact';
import { type Member } from '@api/companies/actor';
import { type Dependencies } from '@api/dependencies';
import { dispatchOrder } from '@api/orders/dispatch-order';
import { moveOrder } from '@api/orders/move-order';
import { placeOrder } from '@api/orders/place-order';
import { readOrder } from '@api/orders/read-order';
import { createQuote } from '@api/quotes/create-quote';
import { changeCredit } from '@api/receivables/change-credit';
import { readCredit } from '@api/receivables/read-credit';
import { readInvoice } from '@api/receivables/read-invoice';
import { recordReceipt } from '@api/receivables/record-receipt';
import { type Chance, chance } from './chance';
import { type DemoDealer, demoDealers } from './dealers';
import { demoFabricators } from './fabricators';
import { tradeAccountId } from './load-companies';
import { customerFor, linesFor, seasonOf } from './demand';

const HOUR_MS = 3_600_000;
/** The end of the history, in which some invoices are left as they are. */
const RECENT_DAYS = 75;

/** Something that happens on a day of the history. */
type Event = (today: string) => void;

/** What the history keeps while it unfolds. */
interface Unfolding {
  dependencies: Dependencies;
  by: Chance;
  /** what is due on a day, in the order it was arranged */
  agenda: Map<string, Event[]>;
  until: string;
  newKey: () => string;
  act: (mailbox: string, company: string) => Member;
}

/**
 * Lets the demo market live from one day to another by the real use cases under a moving
 * clock: dealers quote and order, sales accept, plant makes and dispatches, invoices follow,
 * dealers pay early, late, short or not at all. The same chance in every installation.
 *
 * @param setClock moves the clock of `dependencies`, UTC epoch ms
 * @returns how many orders were placed
 */
export function unfoldHistory(dependencies: Dependencies, setClock: (at: number) => void, from: string, until: string): number {
  const by = chance(20_260);
  let keys = 0;
  const actors = new Map<string, Member>();
  const unfolding: Unfolding = {
    dependencies,
    by,
    agenda: new Map(),
    until,
    newKey: () => `history-${++keys}`,
    act: (mailbox, company) => {
      const key = `${mailbox}.${company}`;
      let actor = actors.get(key);
      if (!actor) actors.set(key, (actor = actorOf(key, dependencies)));
      return actor;
    },
  };
  let placed = 0;
  for (let today = from; today < until; today = addDays(today, 1)) {
    let minutes = 0;
    const tick = () => setClock(Date.parse(`${today}T13:00:00Z`) + minutes++ * 60_000);
    for (const event of unfolding.agenda.get(today) ?? []) {
      tick();
      event(today);
    }
    unfolding.agenda.delete(today);
    if (!isWorkingDay(today, { workingDays: [1, 2, 3, 4, 5], closed: [] })) continue;
    for (const dealer of demoDealers) {
      if (!by.happens((dealer.ordersAMonth * seasonOf(today)) / 23)) continue;
      tick();
      if (order(dealer, today, unfolding)) placed += 1;
    }
  }
  setClock(Date.parse(`${until}T08:00:00Z`) - HOUR_MS);
  endings(unfolding);
  return placed;
}

/** How things stand at the end: one account near its limit, one on hold. */
function endings({ dependencies, act }: Unfolding): void {
  const clerk = act('accounts', 'northmere');
  const near = tradeAccountId('millrace', 'northmere');
  const { exposure } = readCredit(clerk, { params: { id: near } }, dependencies);
  const limit = amountOf(Math.max(0, minorOf(exposure.amount, exposure.currency)) + 45_000, exposure.currency);
  changeCredit(clerk, { params: { id: near }, body: { limit, reason: 'Pays late: limit brought down to what is open' } }, dependencies);
  const held = tradeAccountId('cobble-hill', 'northmere');
  changeCredit(
    clerk,
    { params: { id: held }, body: { onHold: true, reason: 'A month behind and no answer to two letters' } },
    dependencies,
  );
}

function actorOf(personId: string, { stores }: Dependencies): Member {
  const user = stores.people.user(personId);
  return {
    personId,
    sessionId: 'history',
    name: user.name,
    email: user.email,
    roles: user.roles,
    companyId: user.company.id,
    companyKind: user.company.kind,
    companyName: user.company.name,
    timeZone: user.company.timeZone,
    orderLimitMinor: null,
  };
}

function arrange({ agenda, until }: Unfolding, day: string, event: Event): void {
  if (day >= until) return;
  const due = agenda.get(day);
  if (due) due.push(event);
  else agenda.set(day, [event]);
}

/** A dealer quotes and, mostly, orders. False when it came to nothing: credit, limits, a change of mind. */
function order(dealer: DemoDealer, today: string, unfolding: Unfolding): boolean {
  const { by, dependencies, newKey, act } = unfolding;
  const account = by.pick(dealer.accounts);
  const maker = demoFabricators.find(({ id }) => id === account.maker)!;
  const buyer = act('buyer', dealer.id);
  const place = by.happens(0.75) ? 1 : by.whole(1, dealer.places.length);
  const shipTo = `${dealer.id}.place-${place}`;
  const mindChanges = by.happens(0.12);
  try {
    const quote = createQuote(
      buyer,
      {
        body: {
          tradeAccount: tradeAccountId(dealer.id, maker.id),
          lines: linesFor(maker.id, by),
          customer: by.happens(0.7) ? customerFor(by) : undefined,
          markUpPercent: by.pick(['25', '30', '35', '42.5']),
          shipTo,
        },
      },
      dependencies,
    );
    if (mindChanges) return false;
    const placed = placeOrder(
      buyer,
      {
        params: { id: quote.id },
        body: { poNumber: `${dealer.id.slice(0, 3).toUpperCase()}-${by.whole(1000, 9999)}`, shipTo, payment: 'account' },
        idempotencyKey: newKey(),
      },
      dependencies,
    );
    arrange(unfolding, addDays(today, 1), (day) => take(placed, dealer, day, unfolding));
    return true;
  } catch (error) {
    // A refusal is part of the market: over the credit, overdue, a size nobody makes.
    if (error instanceof Refusal) return false;
    throw error;
  }
}

/** Sales accept, then plant makes; a few are cancelled before. */
function take(placed: Order, dealer: DemoDealer, today: string, unfolding: Unfolding): void {
  const { by, dependencies, act } = unfolding;
  const maker = demoFabricators.find(({ id }) => id === placed.fabricator.id)!;
  const move = (actor: Member, to: Order['state'], reason?: string) =>
    moveOrder(actor, { params: { id: placed.id }, body: { to, reason } }, dependencies);
  if (placed.state !== 'submitted') return;
  if (by.happens(0.02)) {
    move(act('buyer', dealer.id), 'cancelled', by.pick(['Customer withdrew', 'Measured again, other sizes', 'Ordered twice']));
    return;
  }
  move(act('sales', maker.id), 'accepted');
  const lead = maker.calendar.leadTimes[0]!.workingDays;
  const begins = addWorkingDays(today, by.whole(1, 3), maker.calendar);
  arrange(unfolding, begins, () => move(act('plant', maker.id), 'in production'));
  const ready = addWorkingDays(begins, Math.max(2, lead - 3 + by.whole(-1, 3)), maker.calendar);
  arrange(unfolding, ready, () => move(act('plant', maker.id), 'ready'));
  arrange(unfolding, addWorkingDays(ready, by.whole(0, 2), maker.calendar), (day) => send(placed, dealer, day, unfolding));
}

/** All of it goes out, or a part now and the rest some days later. */
function send(placed: Order, dealer: DemoDealer, today: string, unfolding: Unfolding): void {
  const { by, dependencies, newKey, act } = unfolding;
  const maker = demoFabricators.find(({ id }) => id === placed.fabricator.id)!;
  const plant = act('plant', maker.id);
  const dispatch = (lines: { line: string; quantity: number }[], day: string) => {
    const after = dispatchOrder(plant, { params: { id: placed.id }, body: { lines }, idempotencyKey: newKey() }, dependencies);
    expectPayment(after, dealer, day, unfolding);
    if (after.state !== 'dispatched') return;
    arrange(unfolding, addDays(day, by.whole(1, 3)), () => {
      const confirm = (to: 'delivered' | 'closed') => moveOrder(plant, { params: { id: placed.id }, body: { to } }, dependencies);
      confirm('delivered');
      if (by.happens(0.9)) confirm('closed');
    });
  };
  const all = placed.lines.map(({ id, quantity }) => ({ line: id, quantity }));
  const first = all.slice(0, Math.ceil(all.length / 2));
  const rest = all.slice(first.length);
  if (rest.length === 0 || !by.happens(0.18)) return dispatch(all, today);
  dispatch(first, today);
  arrange(unfolding, addWorkingDays(today, by.whole(2, 6), maker.calendar), (day) => dispatch(rest, day));
}

/** The newest invoice of the order is paid early for the discount, at its time, late, short, or not at all. */
function expectPayment(sent: Order, dealer: DemoDealer, today: string, unfolding: Unfolding): void {
  const { by, dependencies, act } = unfolding;
  const clerk = act('accounts', sent.fabricator.id);
  const invoiceId = readOrder(clerk, { params: { id: sent.id } }, dependencies).dispatches.at(-1)?.invoice?.id;
  if (!invoiceId) return;
  // Only lately: what nobody pays for months would stop the dealer's orders, as overdue does.
  if (daysBetween(today, unfolding.until) < RECENT_DAYS && by.happens(0.1)) return;
  const invoice = readInvoice(clerk, { params: { id: invoiceId } }, dependencies);
  const takesDiscount = invoice.discount !== null && dealer.paysLate < 0 && by.happens(0.8);
  const due = takesDiscount ? addDays(invoice.discount!.until, -by.whole(0, 2)) : addDays(invoice.dueOn, dealer.paysLate + by.whole(-3, 8));
  const day = workingDayFrom(daysBetween(today, due) < 2 ? addDays(today, 2) : due);
  arrange(unfolding, day, (paidOn) => pay(invoiceId, takesDiscount, paidOn, unfolding, clerk));
}

const workingDayFrom = (day: string): string => {
  let at = day;
  while (!isWorkingDay(at, { workingDays: [1, 2, 3, 4, 5], closed: [] })) at = addDays(at, 1);
  return at;
};

function pay(invoiceId: string, takesDiscount: boolean, paidOn: string, unfolding: Unfolding, clerk: Member): void {
  const { by, dependencies, newKey } = unfolding;
  const invoice = readInvoice(clerk, { params: { id: invoiceId } }, dependencies);
  const { currency } = invoice;
  const openMinor = minorOf(invoice.open.amount, currency);
  if (openMinor === 0) return;
  const discount = takesDiscount && invoice.discount && paidOn <= invoice.discount.until ? invoice.discount : null;
  const discountMinor = discount ? percentOf(openMinor, exact(discount.percent)) : 0;
  const short = !discount && by.happens(0.02);
  const over = !discount && !short && by.happens(0.012);
  const dueMinor = openMinor - discountMinor;
  const appliedMinor = short ? Math.max(1, dueMinor - by.whole(500, 4000)) : dueMinor;
  const receivedMinor = over ? appliedMinor + by.whole(1000, 9000) : appliedMinor;
  recordReceipt(
    clerk,
    {
      body: {
        tradeAccount: invoice.tradeAccount,
        receivedOn: paidOn,
        amount: amountOf(receivedMinor, currency),
        payerReference: by.happens(0.7) ? invoice.reference : `Invoice ${invoice.number}`,
        allocations: [
          {
            invoice: invoiceId,
            amount: amountOf(appliedMinor, currency),
            ...(discountMinor > 0 ? { discount: amountOf(discountMinor, currency) } : {}),
          },
        ],
      },
      idempotencyKey: newKey(),
    },
    dependencies,
  );
  // What was short is asked for, and comes within days.
  if (short) arrange(unfolding, workingDayFrom(addDays(paidOn, by.whole(4, 12))), (day) => pay(invoiceId, false, day, unfolding, clerk));
}

/** The day it is at the market's own place. */
export const marketDay = (at: number): string => dayIn('America/New_York', at);
