import { type EndpointId } from './endpoints';
import { type Role } from './session';

/** `anyone`: visitors too; `signed in`: every role; else the roles listed. */
export type Callers = 'anyone' | 'signed in' | readonly Role[];

const dealer = ['buyer', 'dealer-admin'] as const;
const fabricator = ['sales', 'accounts', 'plant', 'fabricator-admin'] as const;
const clerks = ['accounts', 'fabricator-admin'] as const;

/**
 * Who may call what. The server refuses by it, the client offers by it, and a test walks
 * every endpoint with every role. Whose things a caller sees is decided by the use cases.
 */
export const whoMayCall: Record<EndpointId, Callers> = {
  'system.health': 'anyone',
  'system.openapi': 'anyone',
  'session.sign-in': 'anyone',
  'session.me': 'signed in',
  'session.sign-out': 'signed in',
  'session.list': 'signed in',
  'session.revoke': 'signed in',
  'catalogue.read': 'anyone',
  'units.evaluate': 'anyone',
  'prices.price': dealer,
  'trade-accounts.list': [...dealer, ...fabricator],
  'trade-accounts.credit': [...dealer, 'sales', ...clerks],
  'trade-accounts.movements': ['dealer-admin', ...clerks],
  'trade-accounts.change-credit': clerks,
  'addresses.list': dealer,
  'market.companies': ['operator'],
  'quotes.create': dealer,
  'quotes.list': dealer,
  'quotes.read': dealer,
  'quotes.change': dealer,
  'quotes.add-lines': dealer,
  'quotes.change-lines': dealer,
  'quotes.preview-re-price': dealer,
  'quotes.re-price': dealer,
  'quotes.pdf': dealer,
  'quotes.mail': dealer,
  'orders.place': dealer,
  'orders.list': [...dealer, ...fabricator],
  'orders.read': [...dealer, ...fabricator],
  'orders.move': [...dealer, ...fabricator],
  'orders.dispatch': ['plant', 'fabricator-admin'],
  'orders.pdf': [...dealer, ...fabricator],
  'invoices.list': [...dealer, ...clerks],
  'invoices.read': [...dealer, ...clerks],
  'invoices.pdf': [...dealer, ...clerks],
  'receipts.record': clerks,
  'receipts.list': clerks,
  'receipts.read': clerks,
  'receipts.apply': clerks,
  'receipts.reverse-allocation': clerks,
  'receipts.reverse': clerks,
  'ledger.trial-balance': clerks,
};

/** Whether someone with these roles (none: a visitor) may call the endpoint. */
export function mayCall(endpointId: EndpointId, held: readonly Role[]): boolean {
  const callers = whoMayCall[endpointId];
  if (callers === 'anyone') return true;
  if (callers === 'signed in') return held.length > 0;
  return held.some((role) => callers.includes(role));
}
