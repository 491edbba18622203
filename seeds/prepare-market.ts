import { companies } from '@api/database/schema/companies';
import { hashPassword } from '@api/companies/passwords';
import { type Dependencies } from '@api/dependencies';
import { DEMO_PASSWORD, loadCompanies } from './demo/load-companies';
import { loadPriceLists } from './demo/load-price-lists';
import { loadReference } from './reference/load-reference';

/** The demo market begins this long before the day it is loaded. */
const HISTORY_DAYS = 548;
const DAY_MS = 86_400_000;

/**
 * Brings the reference data up to date and, where the configuration asks for it and the
 * database is empty, loads the demo market.
 */
export async function prepareMarket(dependencies: Dependencies): Promise<void> {
  const { config, database, clock } = dependencies;
  loadReference(dependencies);
  if (!config.demoMarket || database.db.select().from(companies).limit(1).get()) return;
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  const from = clock() - HISTORY_DAYS * DAY_MS;
  database.loading(() =>
    database.immediately(() => {
      loadCompanies(database.db, passwordHash, from);
      loadPriceLists(database.db, from);
    }),
  );
  dependencies.catalogue.changed();
}
