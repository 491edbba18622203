import { eq } from 'drizzle-orm';
import { type Db } from '@api/database/open-database';
import { outboxMails } from '@api/database/schema/mail';
import { companies } from '@api/database/schema/companies';
import { hashPassword } from '@api/companies/passwords';
import { type Dependencies } from '@api/dependencies';
import { unfoldHistory, marketDay } from './demo/history';
import { DEMO_PASSWORD, loadCompanies } from './demo/load-companies';
import { loadPriceLists } from './demo/load-price-lists';
import { loadReference } from './reference/load-reference';

/** The demo market begins this long before the day it is loaded. */
const HISTORY_DAYS = 548;
const DAY_MS = 86_400_000;

/** Identities of the demo market, the same in every installation. */
const demoId = (n: number): string => `demo-${n.toString(36).padStart(6, '0')}`;

/** The history's mails were sent in their day: nobody wants eighteen months of them at the first start. */
function markMailsSent(db: Db): void {
  db.update(outboxMails).set({ state: 'sent', sentAt: outboxMails.createdAt, attempts: 1 }).where(eq(outboxMails.state, 'waiting')).run();
}

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
  database.loading(() => {
    database.immediately(() => {
      loadCompanies(database.db, passwordHash, from);
      loadPriceLists(database.db, from);
    });
    dependencies.catalogue.changed();
    let now = from;
    let ids = 0;
    const historic: Dependencies = { ...dependencies, clock: () => now, newId: () => demoId(++ids) };
    database.immediately(() => {
      const placed = unfoldHistory(historic, (at) => (now = at), marketDay(from), marketDay(clock()));
      markMailsSent(database.db);
      dependencies.log.info({ placed }, 'demo market loaded');
    });
  });
}
