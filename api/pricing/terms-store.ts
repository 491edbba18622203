import { asc, eq, sql } from 'drizzle-orm';
import { type ContractPrice, type Promotion } from '@shared/contracts/price-lists';
import { type Db } from '../database/open-database';
import { contractPrices, promotions } from '../database/schema/pricing';

/** Rows of what is agreed with one trade account, and of what a fabricator offers for a time. */
export function termsStore(db: Db) {
  const contracts = db
    .select({ agreed: contractPrices.agreed })
    .from(contractPrices)
    .where(eq(contractPrices.tradeAccountId, sql.placeholder('id')))
    .orderBy(asc(contractPrices.createdAt), asc(contractPrices.id))
    .prepare();
  const offered = db
    .select({ offered: promotions.offered })
    .from(promotions)
    .where(eq(promotions.fabricatorId, sql.placeholder('id')))
    .orderBy(asc(promotions.createdAt), asc(promotions.id))
    .prepare();

  return {
    contractsOf: (tradeAccountId: string): ContractPrice[] => contracts.all({ id: tradeAccountId }).map(({ agreed }) => agreed),
    promotionsOf: (fabricatorId: string): Promotion[] => offered.all({ id: fabricatorId }).map((row) => row.offered),
  };
}
