import { randomUUID } from 'node:crypto';
import { join } from 'node:path';
import { type Logger, pino } from 'pino';
import { catalogueStore } from './catalogue/catalogue-store';
import { type CurrentCatalogue, currentCatalogue } from './catalogue/current-catalogue';
import { companyStore } from './companies/company-store';
import { peopleStore } from './companies/people-store';
import { type Config } from './config';
import { numberSeriesStore } from './database/number-series-store';
import { type Database, type Db, openDatabase } from './database/open-database';
import { outboxStore } from './mail/outbox-store';
import { idempotencyStore } from './orders/idempotency-store';
import { orderListStore } from './orders/order-list-store';
import { orderStore } from './orders/order-store';
import { priceListStore } from './pricing/price-list-store';
import { termsStore } from './pricing/terms-store';
import { quoteStore } from './quotes/quote-store';
import { invoiceStore } from './receivables/invoice-store';
import { ledgerStore } from './receivables/ledger-store';
import { receiptStore } from './receivables/receipt-store';

/** Milliseconds since 1970, UTC. */
export type Clock = () => number;

/** Everything that reads or writes rows. Inside `database.immediately` they take part in its transaction. */
export function createStores(db: Db) {
  return {
    people: peopleStore(db),
    companies: companyStore(db),
    catalogue: catalogueStore(db),
    outbox: outboxStore(db),
    numbers: numberSeriesStore(db),
    priceLists: priceListStore(db),
    terms: termsStore(db),
    quotes: quoteStore(db),
    idempotency: idempotencyStore(db),
    orders: orderStore(db),
    orderLists: orderListStore(db),
    invoices: invoiceStore(db),
    receipts: receiptStore(db),
    ledger: ledgerStore(db),
  };
}
export type Stores = ReturnType<typeof createStores>;

/** What use cases are handed. */
export interface Dependencies {
  config: Config;
  clock: Clock;
  newId: () => string;
  log: Logger;
  database: Database;
  stores: Stores;
  catalogue: CurrentCatalogue;
}

/** Composition root. Opens the database; nothing else has an effect until it is used. */
export function createDependencies(
  config: Config,
  migrationsFolder: string,
  given: Partial<Pick<Dependencies, 'clock' | 'newId' | 'log' | 'database'>> = {},
): Dependencies {
  const database = given.database ?? openDatabase(join(config.dataDir, 'sealyard.db'), migrationsFolder);
  const stores = createStores(database.db);
  return {
    config,
    clock: given.clock ?? Date.now,
    newId: given.newId ?? randomUUID,
    log: given.log ?? pino({ level: config.logLevel }),
    database,
    stores,
    catalogue: currentCatalogue(stores),
  };
}
