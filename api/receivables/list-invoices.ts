import { dayIn } from '@shared/calendar/days';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { type listInvoices as listInvoicesEndpoint } from '@shared/contracts/receivables';
import { type Member } from '../companies/actor';
import { readCursor, toPage } from '../database/cursor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { type InvoiceFilter } from './invoice-store';
import { invoiceOnWire } from './on-wire';

/**
 * Invoices of one's own company: open ones by the earliest due day, others by the latest. With
 * `q`, those whose number begins with it, or whose reference does where it looks like one.
 */
export function listInvoices(
  actor: Member,
  { query }: Pick<Input<typeof listInvoicesEndpoint>, 'query'>,
  { stores, clock }: Pick<Dependencies, 'stores' | 'clock'>,
): AnswerOf<typeof listInvoicesEndpoint> {
  const today = dayIn(actor.timeZone, clock());
  const filter: InvoiceFilter = {
    companyKind: actor.companyKind === 'dealer' ? 'dealer' : 'fabricator',
    companyId: actor.companyId,
    state: query.state,
    tradeAccountId: query.tradeAccount,
  };
  const after = readCursor(query.cursor, 'string');
  const q = query.q?.replace(/\s/g, '').toUpperCase();
  const by = q && /^RF\d/.test(q) ? 'reference' : 'number';
  const rows = q ? stores.invoices.search(filter, by, q, after, query.limit + 1) : stores.invoices.page(filter, after, query.limit + 1);
  return toPage(
    rows.all(),
    query.limit,
    (row) => invoiceOnWire(row, today),
    (row) => [q ? row[by] : row.dueOn, row.id],
  );
}
