import { listAddresses, listCompanies, listTradeAccounts } from '@shared/contracts/trade-accounts';
import { dayIn } from '@shared/calendar/days';
import { readCursor, toPage } from '../database/cursor';
import { type Route, serve } from '../http/serve';
import { addressOnWire, tradeAccountOnWire } from './company-store';

export const companyRoutes: Route[] = [
  serve(listTradeAccounts, (actor, { query }, { stores }) => {
    const rows = stores.companies.tradeAccountsOf(actor.companyId, readCursor(query.cursor, 'string'), query.limit + 1);
    return toPage(rows, query.limit, tradeAccountOnWire, (row) => [row.other, row.id]);
  }),

  serve(listAddresses, (actor, { query }, { stores, clock }) => {
    const today = dayIn(actor.timeZone, clock());
    const after = readCursor(query.cursor, 'number')?.[0] ?? -1;
    const rows = stores.companies.addressesOf(actor.companyId, after, query.limit + 1);
    return toPage(
      rows,
      query.limit,
      (row) => addressOnWire(row, stores.companies.certificate(actor.companyId, row.jurisdiction, today)),
      (row) => [row.position, row.id],
    );
  }),

  serve(listCompanies, (_actor, { query }, { stores }) => {
    const rows = stores.companies.companiesAfter(readCursor(query.cursor, 'string'), query.limit + 1);
    return toPage(
      rows,
      query.limit,
      ({ company, people, tradeAccounts }) => ({
        id: company.id,
        name: company.name,
        kind: company.kind,
        town: company.town,
        people,
        tradeAccounts,
        since: new Date(company.createdAt).toISOString(),
      }),
      ({ company }) => [company.name, company.id],
    );
  }),
];
