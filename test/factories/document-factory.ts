import {
  type AcknowledgementDocument,
  type InvoiceDocument,
  type RetailQuote,
  type UnitLine,
  type WholesaleQuote,
} from '@api/documents/document-models';
import { type ChargeRow, type Totals } from '@shared/contracts/prices';
import { makeUpText } from '@shared/glazing/make-up-text';
import { type Currency } from '@shared/money/currencies';
import { catalogueFactory, tripleFactory, unitFactory } from './catalogue-factory';

/** Documents to print: made-up companies and figures. */

const catalogue = catalogueFactory();
const at = Date.UTC(2026, 8, 15, 15);
const usd = (amount: string) => ({ amount, currency: 'USD' as Currency });

const ottery = {
  name: 'Ottery Glass & Sash',
  lines: ['22 Weir Street', 'Ottery, OH 44001'],
  email: 'office@ottery.example',
  phone: '+1 555 0120',
};
const northmere = {
  name: 'Northmere Sealed Units',
  lines: ['114 Cullet Road', 'Northmere, OH 44000'],
  email: 'accounts@northmere.example',
  phone: '+1 555 0114',
};
const ottersBarn = { name: 'Ottery Glass & Sash', lines: ['Otter Barn site', '3 Mill Lane', 'Ottery, OH 44001'] };

const glassRow: ChargeRow = {
  family: 'glass',
  label: 'Clear 3 mm, 2 lites',
  basis: { quantity: '13.19444', unit: 'ft²' },
  rate: '4.2',
  list: usd('55.42'),
  discountPercent: '12',
  discountReason: 'tier B',
  net: usd('48.76'),
  rule: 'nm-7/glass/clear-3',
};

/** Lines of the units that a document should show: a plain one, a triple one with a grid, a laminate with a tube. */
export function unitLines(count = 3): (UnitLine & { charges: ChargeRow[] })[] {
  const units = [
    unitFactory(),
    tripleFactory({ width: '1800', height: '700', grid: { bar: 'flat-25', across: 3, down: 1 } }),
    unitFactory({
      width: '762',
      height: '2032',
      lites: [
        { glass: 'clear-6', treatment: 'tempered', edgeWork: 'ground' },
        { glass: 'laminated-clear-8', treatment: 'annealed', coating: { id: 'low-e-hard', surface: 4 }, edgeWork: 'ground' },
      ],
      cavities: [{ width: '12', gas: 'air', spacer: 'aluminium', capillary: true }],
    }),
  ];
  const tags = ['Bay, left', 'Kitchen over the sink, second from the left', null];
  return Array.from({ length: count }, (_, i) => {
    const unit = units[i % units.length]!;
    return {
      position: i + 1,
      tag: tags[i % tags.length]!,
      unit,
      makeUp: makeUpText(unit, catalogue),
      quantity: 6,
      unitPrice: usd('184.23'),
      linePrice: usd('1105.38'),
      charges: [
        glassRow,
        { ...glassRow, family: 'gas', label: 'Argon', rate: '0.55', list: usd('7.26'), discountPercent: '5', net: usd('6.90') },
      ],
    };
  });
}

const totals: Totals = {
  goods: usd('3316.14'),
  orderCharges: [{ family: 'delivery', label: 'Delivery, local zone', net: usd('45.00'), rule: 'nm-7/delivery/local' }],
  tax: [{ label: 'Ohio sales tax', rate: '5.75', base: usd('3361.14'), amount: usd('193.27') }],
  total: usd('3554.41'),
};

const head = { at, locale: 'en-US', timeZone: 'America/New_York', measureSystem: 'imperial' as const };
const quoteHead = {
  ...head,
  sender: ottery,
  number: 'OG-1042',
  validUntil: '2026-10-15',
  preparedBy: 'Mina Calloway',
  customer: { name: 'R. Penhallow', lines: ['7 Harbour Row', 'Ottery, OH 44001'] },
  notes: 'Old units are taken away. Please keep the sills clear.',
  catalogue,
};

export function retailQuoteFactory(overrides: Partial<RetailQuote> = {}): RetailQuote {
  const lines = unitLines().map(({ charges: _charges, ...line }) => ({ ...line, unitPrice: usd('248.71'), linePrice: usd('1492.26') }));
  return { ...quoteHead, prices: 'retail', lines, total: usd('4476.78'), ...overrides };
}

export function wholesaleQuoteFactory(overrides: Partial<WholesaleQuote> = {}): WholesaleQuote {
  return {
    ...quoteHead,
    prices: 'wholesale',
    fabricator: northmere.name,
    priceList: 'Northmere trade list of 1 September 2026',
    leadTimeDays: 8,
    shipTo: ottersBarn,
    lines: unitLines(),
    totals,
    ...overrides,
  };
}

export function acknowledgementFactory(overrides: Partial<AcknowledgementDocument> = {}): AcknowledgementDocument {
  return {
    ...head,
    sender: northmere,
    number: 'NM-O-2207',
    dealer: ottery,
    shipTo: ottersBarn,
    poNumber: 'PO 5518',
    placedBy: 'Mina Calloway',
    requiredOn: '2026-10-02',
    promisedOn: '2026-09-25',
    terms: '2 % 10 net 30',
    catalogue,
    lines: unitLines(),
    totals,
    ...overrides,
  };
}

export function invoiceFactory(overrides: Partial<InvoiceDocument> = {}): InvoiceDocument {
  return {
    ...head,
    sender: northmere,
    number: 'NM-24-1187',
    dealer: ottery,
    shipTo: ottersBarn,
    issuedOn: '2026-09-25',
    dueOn: '2026-10-25',
    terms: '2 % 10 net 30',
    discount: { percent: '2', until: '2026-10-05', amount: usd('71.09') },
    reference: 'RF35NM241187',
    bankDetails: ['Lakeside Trade Bank', 'account 0044 7710 2290'],
    orderNumber: 'NM-O-2207',
    poNumber: 'PO 5518',
    dispatchNumber: 'NM-D-3310',
    lines: unitLines().map(({ position, tag, makeUp, quantity, unitPrice, linePrice }) => {
      return { position, tag, description: `36 1/2 × 48 1/4 in, ${makeUp}`, quantity, unitPrice, linePrice };
    }),
    totals,
    ...overrides,
  };
}
