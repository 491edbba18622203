import { type Currency } from '@shared/money/currencies';
import { type Stores } from '../dependencies';
import { type LedgerEvent } from './ledger-events';

/** Whose ledger, for which account, when and by whom. */
export interface PostingContext {
  stores: Pick<Stores, 'ledger' | 'numbers' | 'companies'>;
  newId: () => string;
  fabricatorId: string;
  tradeAccountId: string;
  currency: Currency;
  /** the day in the books */
  on: string;
  /** UTC epoch ms */
  at: number;
  personId: string;
}

/**
 * The only way into the ledger: writes the entry of an event and moves the account's cached
 * receivable and unapplied cash by the same amounts. Runs inside the caller's transaction.
 * An event of nothing (an invoice of goods without a price) makes no entry.
 *
 * @param reverses the entry that this one takes back
 * @throws Error when the amounts do not sum to zero
 */
export function postEntry(context: PostingContext, event: LedgerEvent, reverses: string | null = null): void {
  const amounts = event.amounts.filter(([, minor]) => minor !== 0);
  if (amounts.reduce((sum, [, minor]) => sum + minor, 0) !== 0) throw new Error(`${event.memo}: debits and credits differ`);
  if (amounts.length === 0) return;
  const { stores, fabricatorId, tradeAccountId, currency, on, at, personId } = context;
  stores.ledger.write(
    {
      id: context.newId(),
      fabricatorId,
      sequence: stores.numbers.next(fabricatorId, 'entry'),
      on,
      at,
      kind: event.kind,
      memo: event.memo,
      tradeAccountId,
      documentKind: event.document.kind,
      documentId: event.document.id,
      reverses,
      personId,
    },
    amounts.map(([account, minor]) => ({ account, currency, debitMinor: Math.max(0, minor), creditMinor: Math.max(0, -minor) })),
  );
  const moved = (account: string) => amounts.reduce((sum, [name, minor]) => (name === account ? sum + minor : sum), 0);
  stores.companies.addToBalances(tradeAccountId, { receivableMinor: moved('receivable'), unappliedMinor: 0 - moved('unapplied cash') });
}
