import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { reversalOf } from './ledger-events';
import { postEntry } from './post-entry';

/**
 * Posts the mirror of every entry of a document that is not itself a reversal. Runs inside the
 * caller's transaction; the database refuses to reverse an entry twice.
 *
 * @param on the day in the books: an entry is never reversed before its own day
 */
export function reverseEntries(
  actor: Member,
  documentKind: 'receipt' | 'allocation',
  documentId: string,
  { reason, on }: { reason: string; on: string },
  { stores, clock, newId }: Pick<Dependencies, 'stores' | 'clock' | 'newId'>,
): void {
  for (const entry of stores.ledger.entriesOf(documentKind, [documentId])) {
    const [first] = entry.postings;
    if (entry.reverses !== null || !first || entry.tradeAccountId === null) continue;
    postEntry(
      {
        stores,
        newId,
        fabricatorId: entry.fabricatorId,
        tradeAccountId: entry.tradeAccountId,
        currency: first.currency,
        on: on > entry.on ? on : entry.on,
        at: clock(),
        personId: actor.personId,
      },
      reversalOf({ memo: entry.memo, document: { kind: documentKind, id: documentId }, postings: entry.postings }, reason),
      entry.id,
    );
  }
}
