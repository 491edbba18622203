import { type AnswerOf } from '@shared/contracts/endpoint';
import { Refusal } from '@shared/contracts/problems';
import { type listMovements as listMovementsEndpoint } from '@shared/contracts/trade-accounts';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { readCursor, writeCursor } from '../database/cursor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { type Entry } from './ledger-store';

/**
 * What was posted to receivable and unapplied cash of an account, the latest first, with the
 * balance after each: receivable less unapplied cash, drawn from the entries themselves.
 */
export function listMovements(
  actor: Member,
  { params, query }: Pick<Input<typeof listMovementsEndpoint>, 'params' | 'query'>,
  { stores }: Pick<Dependencies, 'stores'>,
): AnswerOf<typeof listMovementsEndpoint> {
  const account = stores.companies.tradeAccountOf(actor.companyId, params.id);
  if (!account) throw new Refusal('not-found', 'There is no such trade account of yours.');
  const after = readCursor(query.cursor, 'number')?.[0];
  const rows = stores.ledger.entriesBefore(account.id, after, query.limit + 1);
  const shown = rows.slice(0, query.limit);
  const numbers = stores.ledger.documentNumbers(shown);
  let balance = shown[0] ? stores.ledger.accountBalanceAt(account.id, shown[0].sequence) : 0;
  const items = shown.map((entry) => {
    const { debit, credit } = movedBy(entry);
    const number = numbers.get(entry.documentId);
    const item = {
      id: entry.id,
      on: entry.on,
      kind: entry.kind,
      memo: entry.memo,
      document: number === undefined ? null : { kind: entry.documentKind, id: entry.documentId, number },
      debit: money(debit, account.currency),
      credit: money(credit, account.currency),
      balance: money(balance, account.currency),
    };
    balance -= debit - credit;
    return item;
  });
  const last = shown.at(-1);
  return { items, nextCursor: rows.length > query.limit && last ? writeCursor([last.sequence, last.id]) : null };
}

/** Minor units that an entry put on either side of receivable and unapplied cash together. */
function movedBy({ postings }: Entry): { debit: number; credit: number } {
  const own = postings.filter(({ account }) => account === 'receivable' || account === 'unapplied cash');
  return {
    debit: own.reduce((sum, { debitMinor }) => sum + debitMinor, 0),
    credit: own.reduce((sum, { creditMinor }) => sum + creditMinor, 0),
  };
}
