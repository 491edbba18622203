import { type InvoiceItem } from '@shared/contracts/receivables';
import { type Currency } from '@shared/money/currencies';
import { minorOf } from '@shared/money/money';

/** What is typed beside one open invoice. */
export interface TypedShare {
  invoice: string;
  /** as typed; empty: nothing of the receipt goes there */
  amount: string;
  discount: string;
}

/** The sum on the screen: received, applied, discount taken, and what stays unapplied; whole minor units. */
export interface ShareSum {
  receivedMinor: number | null;
  appliedMinor: number;
  discountMinor: number;
  /** null until the received amount can be read; negative when more is applied than was received */
  unappliedMinor: number | null;
  /** what is wrong, by invoice */
  wrong: Map<string, string>;
}

/** A typed amount in whole minor units; null when it is not one. An empty text is 0. */
export function typedMinor(text: string, currency: Currency): number | null {
  const plain = text.trim();
  if (plain === '') return 0;
  if (!/^\d{1,12}(\.\d{1,3})?$/.test(plain)) return null;
  try {
    return minorOf(plain, currency);
  } catch {
    // More decimals than the currency has: not an amount in it.
    return null;
  }
}

/** Adds up what was typed against the open invoices. */
export function sumShares(received: string, shares: readonly TypedShare[], invoices: readonly InvoiceItem[], currency: Currency): ShareSum {
  const receivedMinor = received.trim() === '' ? null : typedMinor(received, currency);
  const wrong = new Map<string, string>();
  let appliedMinor = 0;
  let discountMinor = 0;
  for (const share of shares) {
    const invoice = invoices.find(({ id }) => id === share.invoice);
    const amount = typedMinor(share.amount, currency);
    const discount = typedMinor(share.discount, currency);
    if (!invoice) continue;
    if (amount === null || discount === null) {
      wrong.set(share.invoice, 'Type a plain amount, such as 1105.38.');
      continue;
    }
    if (amount + discount > minorOf(invoice.open.amount, currency)) wrong.set(share.invoice, `Only ${invoice.open.amount} is open.`);
    if (amount === 0 && discount > 0) wrong.set(share.invoice, 'A discount goes with a payment.');
    appliedMinor += amount;
    discountMinor += discount;
  }
  return {
    receivedMinor,
    appliedMinor,
    discountMinor,
    unappliedMinor: receivedMinor === null ? null : receivedMinor - appliedMinor,
    wrong,
  };
}

/** Fills open invoices, oldest due first, with what there is: whole ones, and a part of the last. */
export function fillOldest(availableMinor: number, invoices: readonly InvoiceItem[], currency: Currency): Map<string, number> {
  const filled = new Map<string, number>();
  let left = availableMinor;
  for (const invoice of [...invoices].sort((a, b) => (a.dueOn < b.dueOn ? -1 : a.dueOn > b.dueOn ? 1 : 0))) {
    if (left <= 0) break;
    const share = Math.min(left, minorOf(invoice.open.amount, currency));
    filled.set(invoice.id, share);
    left -= share;
  }
  return filled;
}
