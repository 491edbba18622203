import { type Quote, type QuoteLine } from '@shared/contracts/quotes';
import { unitFactory } from './catalogue-factory';

const usd = (amount: string) => ({ amount, currency: 'USD' as const });

/** A line of six units of the worked example. */
export function lineFactory(overrides: Partial<QuoteLine> & { id: string }): QuoteLine {
  return {
    position: 0,
    tag: `tag ${overrides.id}`,
    unit: unitFactory(),
    quantity: 6,
    extras: [],
    makeUp: '3 temp / 16 argon / 3 temp low-e 3',
    unitPrice: usd('184.23'),
    linePrice: usd('1105.38'),
    charges: [],
    hints: [],
    retail: { unitPrice: usd('184.23'), linePrice: usd('1105.38') },
    ...overrides,
  };
}

/** An open quote with three lines `a`, `b` and `c`, at its first revision. */
export function quoteFactory(overrides: Partial<Quote> = {}): Quote {
  return {
    id: 'q1',
    number: 'Q-000012',
    state: 'open',
    tradeAccount: 'account',
    fabricator: { id: 'maker', name: 'Wide Works' },
    currency: 'USD',
    customer: null,
    markUpPercent: '0',
    notes: '',
    validUntil: '2026-04-04',
    createdAt: '2026-03-05T10:00:00.000Z',
    updatedAt: '2026-03-05T10:00:00.000Z',
    createdBy: 'Ana Buyer',
    units: 18,
    total: usd('3316.14'),
    order: null,
    revision: 1,
    priceListVersion: 'v1',
    priceList: { name: 'March', effectiveFrom: '2026-03-01T00:00:00.000Z' },
    pricedAt: '2026-03-05T10:00:00.000Z',
    shipTo: null,
    leadTimeDays: 8,
    earliestOn: '2026-03-17',
    lines: ['a', 'b', 'c'].map((id, position) => lineFactory({ id, position })),
    goods: usd('3316.14'),
    orderCharges: [],
    tax: [],
    retailGoods: usd('3316.14'),
    mails: [],
    ...overrides,
  };
}
