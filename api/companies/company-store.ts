import { and, asc, eq, gt, gte, lte, or, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import { type Address, type TradeAccount } from '@shared/contracts/trade-accounts';
import { type Db } from '../database/open-database';
import {
  accountBalances,
  addresses,
  auditRows,
  companies,
  exemptionCertificates,
  fabricators,
  people,
  tradeAccounts,
} from '../database/schema/companies';

const dealers = alias(companies, 'dealers');
const makers = alias(companies, 'makers');

export type TradeAccountRow = typeof tradeAccounts.$inferSelect & { dealerName: string; fabricatorName: string };

/** Rows of companies, trade accounts, their balances and the ship-to books. */
export function companyStore(db: Db) {
  const accountColumns = {
    account: tradeAccounts,
    dealerName: sql<string>`${dealers.name}`.as('dealer_name'),
    fabricatorName: sql<string>`${makers.name}`.as('fabricator_name'),
  };
  const accounts = () =>
    db
      .select(accountColumns)
      .from(tradeAccounts)
      .innerJoin(dealers, eq(dealers.id, tradeAccounts.dealerId))
      .innerJoin(makers, eq(makers.id, tradeAccounts.fabricatorId));
  const flat = (row: { account: typeof tradeAccounts.$inferSelect; dealerName: string; fabricatorName: string }): TradeAccountRow => ({
    ...row.account,
    dealerName: row.dealerName,
    fabricatorName: row.fabricatorName,
  });

  // Asked for by every price, order and credit check: built once.
  const id = sql.placeholder('id');
  const companyById = db.select().from(companies).where(eq(companies.id, id)).prepare();
  const fabricatorById = db.select().from(fabricators).where(eq(fabricators.companyId, id)).prepare();
  const accountById = accounts().where(eq(tradeAccounts.id, id)).prepare();
  const balancesById = db.select().from(accountBalances).where(eq(accountBalances.tradeAccountId, id)).prepare();
  const addition = (column: 'receivableMinor' | 'unappliedMinor' | 'reservedMinor') =>
    sql`${accountBalances[column]} + ${sql.placeholder(column)}`;
  const addToBalances = db
    .update(accountBalances)
    .set({
      receivableMinor: addition('receivableMinor'),
      unappliedMinor: addition('unappliedMinor'),
      reservedMinor: addition('reservedMinor'),
    })
    .where(eq(accountBalances.tradeAccountId, id))
    .prepare();
  const addressOf = db
    .select()
    .from(addresses)
    .where(and(eq(addresses.id, id), eq(addresses.companyId, sql.placeholder('companyId'))))
    .prepare();
  const certificate = db
    .select()
    .from(exemptionCertificates)
    .where(
      and(
        eq(exemptionCertificates.dealerId, id),
        eq(exemptionCertificates.jurisdiction, sql.placeholder('jurisdiction')),
        lte(exemptionCertificates.validFrom, sql.placeholder('on')),
        gte(exemptionCertificates.validUntil, sql.placeholder('on')),
      ),
    )
    .prepare();
  const recordChange = db
    .insert(auditRows)
    .values({
      companyId: sql.placeholder('companyId'),
      personId: sql.placeholder('personId'),
      at: sql.placeholder('at'),
      action: sql.placeholder('action'),
      subjectKind: sql.placeholder('subjectKind'),
      subjectId: sql.placeholder('subjectId'),
      before: sql.placeholder('before'),
      after: sql.placeholder('after'),
      reason: sql.placeholder('reason'),
    })
    .prepare();
  const tradeAccount = (accountId: string): TradeAccountRow | undefined => {
    const row = accountById.get({ id: accountId });
    return row && flat(row);
  };

  return {
    company: (companyId: string) => companyById.get({ id: companyId }),

    fabricator: (companyId: string) => fabricatorById.get({ id: companyId }),

    allFabricators: () =>
      db.select().from(fabricators).innerJoin(companies, eq(companies.id, fabricators.companyId)).orderBy(asc(companies.name)).all(),

    /** A trade account of this company, on either side of it. */
    tradeAccountOf: (companyId: string, accountId: string): TradeAccountRow | undefined => {
      const row = tradeAccount(accountId);
      return row && (row.dealerId === companyId || row.fabricatorId === companyId) ? row : undefined;
    },

    tradeAccount,

    openAccountsOfDealer: (dealerId: string): TradeAccountRow[] =>
      accounts()
        .where(and(eq(tradeAccounts.dealerId, dealerId), eq(tradeAccounts.state, 'open')))
        .orderBy(asc(makers.name))
        .all()
        .map(flat),

    /** Up to `limit` accounts of a company after (name of the other side, id). */
    tradeAccountsOf: (companyId: string, after: [string, string] | undefined, limit: number): (TradeAccountRow & { other: string })[] => {
      const other = sql<string>`case when ${tradeAccounts.dealerId} = ${companyId} then ${makers.name} else ${dealers.name} end`;
      return accounts()
        .where(
          and(
            or(eq(tradeAccounts.dealerId, companyId), eq(tradeAccounts.fabricatorId, companyId)),
            after ? sql`(${other}, ${tradeAccounts.id}) > (${after[0]}, ${after[1]})` : undefined,
          ),
        )
        .orderBy(other, asc(tradeAccounts.id))
        .limit(limit)
        .all()
        .map((row) => ({ ...flat(row), other: row.account.dealerId === companyId ? row.fabricatorName : row.dealerName }));
    },

    changeTradeAccount: (accountId: string, change: Partial<Pick<TradeAccountRow, 'limitMinor' | 'onHold' | 'countsFrom'>>) =>
      db.update(tradeAccounts).set(change).where(eq(tradeAccounts.id, accountId)).run(),

    /** @throws Error when the account has no balances: each account is made with them */
    balances: (accountId: string): typeof accountBalances.$inferSelect => {
      const found = balancesById.get({ id: accountId });
      if (!found) throw new Error(`no balances of trade account ${accountId}`);
      return found;
    },

    /** Adds signed minor units to the cached balances; the database refuses what would fall below zero. */
    addToBalances: (accountId: string, change: { receivableMinor?: number; unappliedMinor?: number; reservedMinor?: number }) =>
      addToBalances.run({ receivableMinor: 0, unappliedMinor: 0, reservedMinor: 0, ...change, id: accountId }),

    addressOf: (companyId: string, addressId: string) => addressOf.get({ id: addressId, companyId }),

    firstAddressOf: (companyId: string) =>
      db.select().from(addresses).where(eq(addresses.companyId, companyId)).orderBy(asc(addresses.position)).limit(1).get(),

    addressesOf: (companyId: string, afterPosition: number, limit: number) =>
      db
        .select()
        .from(addresses)
        .where(and(eq(addresses.companyId, companyId), gt(addresses.position, afterPosition)))
        .orderBy(asc(addresses.position))
        .limit(limit)
        .all(),

    /** The exemption certificate of a dealer for a jurisdiction in force on a day. */
    certificate: (dealerId: string, jurisdiction: string, on: string) => certificate.get({ id: dealerId, jurisdiction, on }),

    companiesAfter: (after: [string, string] | undefined, limit: number) =>
      db
        .select({
          company: companies,
          people: sql<number>`(select count(*) from ${people} where ${people.companyId} = ${companies.id})`,
          tradeAccounts: sql<number>`(select count(*) from ${tradeAccounts} where ${tradeAccounts.dealerId} = ${companies.id} or ${tradeAccounts.fabricatorId} = ${companies.id})`,
        })
        .from(companies)
        .where(after ? sql`(${companies.name}, ${companies.id}) > (${after[0]}, ${after[1]})` : undefined)
        .orderBy(asc(companies.name), asc(companies.id))
        .limit(limit)
        .all(),

    /** Who changed what, before and after. */
    recordChange: (row: Required<Omit<typeof auditRows.$inferInsert, 'id'>>) => recordChange.run(row),
  };
}

export const tradeAccountOnWire = (row: TradeAccountRow): TradeAccount => ({
  id: row.id,
  dealer: { id: row.dealerId, name: row.dealerName },
  fabricator: { id: row.fabricatorId, name: row.fabricatorName },
  currency: row.currency,
  state: row.state,
  tier: row.tier,
  terms: row.terms,
  onHold: row.onHold,
  countsFrom: row.countsFrom,
  graceDays: row.graceDays,
});

export const addressOnWire = (
  row: typeof addresses.$inferSelect,
  certificate: typeof exemptionCertificates.$inferSelect | undefined,
): Address => ({
  id: row.id,
  label: row.label,
  lines: row.lines,
  town: row.town,
  region: row.region,
  postcode: row.postcode,
  country: row.country,
  jurisdiction: row.jurisdiction,
  zone: row.zone,
  altitude: row.altitudeM,
  exempt: certificate ? { certificate: certificate.certificate, until: certificate.validUntil } : null,
});
