import type { ChargeRow, Offer } from '@shared/contracts/prices';
import type { Money } from '@shared/money/money';

const usd = (amount: string): Money => ({ amount, currency: 'USD' });

/** One row of a charge sheet: 13.19… ft² of glass under tier B, unless told otherwise. */
export function chargeFactory(overrides: Partial<ChargeRow> = {}): ChargeRow {
  return {
    family: 'glass',
    label: 'glass, lite 1',
    basis: { quantity: '13.19444444444444444444444444444444444444', unit: 'ft²' },
    rate: '2.10',
    list: usd('27.71'),
    discountPercent: '12',
    discountReason: 'tier B',
    net: usd('24.38'),
    rule: 'northmere.3/glass/clear-3',
    ...overrides,
  };
}

/** One maker's offer of one line at `unitPrice`. */
export function offerFactory(unitPrice: string, overrides: Partial<Offer> = {}): Offer {
  return {
    tradeAccount: 'ottery-northmere',
    fabricator: { id: 'northmere', name: 'Northmere Sealed Units' },
    currency: 'USD',
    priceListVersion: 'northmere.3',
    priceList: { name: 'Northmere trade list, version 3', effectiveFrom: '2026-09-01T00:00:00Z' },
    canBuild: true,
    reasons: [],
    leadTimeDays: 8,
    lines: [{ unitPrice: usd(unitPrice), linePrice: usd(unitPrice), charges: [chargeFactory({ net: usd(unitPrice) })], hints: [] }],
    ...overrides,
  };
}

/** The answer to a price call with one offer. */
export function priceAnswerFactory(unitPrice: string, overrides: Partial<Offer> = {}): { offers: Offer[]; pricedAt: string } {
  return { offers: [offerFactory(unitPrice, overrides)], pricedAt: '2026-09-15T15:00:00Z' };
}
