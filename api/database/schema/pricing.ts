import { sql } from 'drizzle-orm';
import { check, index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { type Catalogue } from '@shared/contracts/catalogue';
import { type ContractPrice, type PriceListContent, type Promotion } from '@shared/contracts/price-lists';
import { type Currency } from '@shared/money/currencies';
import { companies, people, tradeAccounts } from './companies';
import { id, instant, isCurrency, json, oneOf } from './columns';

export const catalogueParts = ['glasses', 'treatments', 'coatings', 'spacers', 'gases', 'grids', 'shapes', 'edgeWork'] as const;
export type CataloguePart = (typeof catalogueParts)[number];

/** Reference data: one row an item, its physical data as the contract has it. */
export const catalogueItems = sqliteTable(
  'catalogue_items',
  {
    part: text('part', { enum: catalogueParts }).notNull(),
    id: text('id').notNull(),
    position: integer('position').notNull(),
    data: json<Catalogue[CataloguePart][number]>('data').notNull(),
  },
  (t) => [primaryKey({ columns: [t.part, t.id] }), oneOf('catalogue_items_part', t.part, catalogueParts)],
);

export const priceLists = sqliteTable(
  'price_lists',
  {
    id: id(),
    fabricatorId: text('fabricator_id')
      .notNull()
      .references(() => companies.id),
    name: text('name').notNull(),
    currency: text('currency').$type<Currency>().notNull(),
    measure: text('measure', { enum: ['imperial', 'metric'] }).notNull(),
  },
  (t) => [isCurrency('price_lists_currency', t.currency), index('price_lists_by_fabricator').on(t.fabricatorId)],
);

/** A version never changes once published (trigger). */
export const priceListVersions = sqliteTable(
  'price_list_versions',
  {
    id: id(),
    listId: text('list_id')
      .notNull()
      .references(() => priceLists.id),
    number: integer('number').notNull(),
    state: text('state', { enum: ['draft', 'published'] }).notNull(),
    content: json<PriceListContent>('content').notNull(),
    effectiveFrom: instant('effective_from'),
    publishedAt: instant('published_at'),
    createdAt: instant('created_at').notNull(),
    createdBy: text('created_by').references(() => people.id),
    reason: text('reason').notNull(),
  },
  (t) => [
    oneOf('price_list_versions_state', t.state, ['draft', 'published']),
    check('price_list_versions_published', sql`(${t.state} = 'published') = (${t.effectiveFrom} is not null)`),
    uniqueIndex('price_list_versions_by_number').on(t.listId, t.number),
    index('price_list_versions_in_force').on(t.listId, t.state, t.effectiveFrom),
  ],
);

export const contractPrices = sqliteTable(
  'contract_prices',
  {
    id: id(),
    tradeAccountId: text('trade_account_id')
      .notNull()
      .references(() => tradeAccounts.id),
    agreed: json<ContractPrice>('agreed').notNull(),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [index('contract_prices_by_account').on(t.tradeAccountId)],
);

export const promotions = sqliteTable(
  'promotions',
  {
    id: id(),
    fabricatorId: text('fabricator_id')
      .notNull()
      .references(() => companies.id),
    offered: json<Promotion>('offered').notNull(),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [index('promotions_by_fabricator').on(t.fabricatorId)],
);
