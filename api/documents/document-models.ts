import { type Catalogue } from '@shared/contracts/catalogue';
import { type ChargeRow, type Totals } from '@shared/contracts/prices';
import { type Unit } from '@shared/contracts/units';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { type Money } from '@shared/money/money';

/**
 * What documents are made from: plain data, all of it. The same model gives the same bytes, so
 * that a reprint never differs. A day is `YYYY-MM-DD`, an instant UTC epoch milliseconds, money
 * as on the wire; texts stand on paper as they are given.
 */

/** The company in whose name a document goes out. */
export interface Sender {
  name: string;
  lines: string[];
  email: string;
  phone: string;
}

/** Whom it is for, or where the units go. */
export interface Party {
  name: string;
  lines: string[];
}

interface DocumentHead {
  sender: Sender;
  number: string;
  /** when what it says was so; the date on the document, and of the file */
  at: number;
  /** the sender's: BCP 47 locale, IANA time zone, and the measures that come first; imperial prints on Letter, metric on A4 */
  locale: string;
  timeZone: string;
  measureSystem: MeasureSystem;
}

/** A line with its drawings. */
export interface UnitLine {
  position: number;
  tag: string | null;
  unit: Unit;
  makeUp: string;
  quantity: number;
  unitPrice: Money;
  linePrice: Money;
}

interface QuoteHead extends DocumentHead {
  validUntil: string;
  preparedBy: string;
  customer: Party | null;
  notes: string;
  /** looked up for the drawings and the details of each unit */
  catalogue: Catalogue;
}

/** For the dealer's customer: the dealer's own prices, and nothing of the fabricator's. */
export interface RetailQuote extends QuoteHead {
  prices: 'retail';
  lines: UnitLine[];
  /** sum of the lines */
  total: Money;
}

/** For the dealer's own use: what the fabricator charges, row by row. */
export interface WholesaleQuote extends QuoteHead {
  prices: 'wholesale';
  fabricator: string;
  priceList: string;
  leadTimeDays: number | null;
  shipTo: Party | null;
  lines: (UnitLine & { charges: ChargeRow[] })[];
  totals: Totals;
}

export type QuoteDocument = RetailQuote | WholesaleQuote;

export interface AcknowledgementDocument extends DocumentHead {
  dealer: Party;
  shipTo: Party;
  poNumber: string;
  placedBy: string;
  requiredOn: string | null;
  promisedOn: string | null;
  /** as the trade says them, e.g. `2 % 10 net 30`; `card` for an order paid by card */
  terms: string;
  catalogue: Catalogue;
  lines: UnitLine[];
  totals: Totals;
}

export interface InvoiceDocument extends DocumentHead {
  dealer: Party;
  shipTo: Party;
  issuedOn: string;
  dueOn: string;
  terms: string;
  discount: { percent: string; until: string; amount: Money } | null;
  /** ISO 11649, without spaces */
  reference: string;
  /** where to pay, a line each */
  bankDetails: string[];
  orderNumber: string;
  poNumber: string;
  dispatchNumber: string;
  lines: { position: number; tag: string | null; description: string; quantity: number; unitPrice: Money; linePrice: Money }[];
  totals: Totals;
}
