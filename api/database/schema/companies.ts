import { sql } from 'drizzle-orm';
import { index, primaryKey, real, sqliteTable, text, uniqueIndex, integer } from 'drizzle-orm/sqlite-core';
import { type Terms } from '@shared/contracts/trade-accounts';
import { companyKinds, type Role, roles } from '@shared/contracts/session';
import { type Currency } from '@shared/money/currencies';
import { type Capabilities } from '@shared/contracts/catalogue';
import { day, flag, id, instant, isCurrency, isDay, json, minor, notNegative, oneOf } from './columns';

/** How a company writes to its customers; stands at the head of its documents. */
export interface Letterhead {
  lines: string[];
  email: string;
  phone: string;
  registration: string;
}

/** A fabricator's working days and lead times. */
export interface PlantCalendar {
  /** ISO weekdays worked, 1 is Monday */
  workingDays: number[];
  /** closed days, YYYY-MM-DD */
  closed: string[];
  leadTimes: { class: string; name: string; workingDays: number }[];
}

export const companies = sqliteTable(
  'companies',
  {
    id: id(),
    kind: text('kind', { enum: companyKinds }).notNull(),
    name: text('name').notNull(),
    town: text('town').notNull(),
    country: text('country').notNull(),
    emailDomain: text('email_domain').notNull(),
    measureSystem: text('measure_system', { enum: ['imperial', 'metric'] }).notNull(),
    timeZone: text('time_zone').notNull(),
    locale: text('locale').notNull(),
    letterhead: json<Letterhead>('letterhead').notNull(),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [
    oneOf('companies_kind', t.kind, companyKinds),
    oneOf('companies_measure_system', t.measureSystem, ['imperial', 'metric']),
    index('companies_by_name').on(t.name, t.id),
    uniqueIndex('companies_by_domain').on(t.emailDomain),
  ],
);

export const fabricators = sqliteTable('fabricators', {
  companyId: text('company_id')
    .primaryKey()
    .references(() => companies.id),
  about: text('about').notNull(),
  plantAltitudeM: real('plant_altitude_m').notNull(),
  capabilities: json<Capabilities>('capabilities').notNull(),
  calendar: json<PlantCalendar>('calendar').notNull(),
  /** the prefix of its order, invoice and dispatch numbers */
  numberPrefix: text('number_prefix').notNull(),
  takesCards: flag('takes_cards').notNull().default(false),
});

export const people = sqliteTable(
  'people',
  {
    id: id(),
    companyId: text('company_id')
      .notNull()
      .references(() => companies.id),
    email: text('email').notNull(),
    name: text('name').notNull(),
    passwordHash: text('password_hash').notNull(),
    active: flag('active').notNull().default(true),
    /** an order above this waits for the dealer admin; null: no limit. Counts the order's total. */
    orderLimitMinor: minor('order_limit_minor'),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [uniqueIndex('people_by_email').on(sql`lower(${t.email})`), index('people_by_company').on(t.companyId)],
);

export const personRoles = sqliteTable(
  'person_roles',
  {
    personId: text('person_id')
      .notNull()
      .references(() => people.id),
    role: text('role', { enum: roles }).$type<Role>().notNull(),
  },
  (t) => [primaryKey({ columns: [t.personId, t.role] }), oneOf('person_roles_role', t.role, roles)],
);

/** A signed-in session; `id` is the token id of its JWT. */
export const sessions = sqliteTable(
  'sessions',
  {
    id: id(),
    personId: text('person_id')
      .notNull()
      .references(() => people.id),
    startedAt: instant('started_at').notNull(),
    expiresAt: instant('expires_at').notNull(),
    revokedAt: instant('revoked_at'),
    userAgent: text('user_agent').notNull(),
  },
  (t) => [index('sessions_by_person').on(t.personId, t.expiresAt)],
);

export const tradeAccounts = sqliteTable(
  'trade_accounts',
  {
    id: id(),
    dealerId: text('dealer_id')
      .notNull()
      .references(() => companies.id),
    fabricatorId: text('fabricator_id')
      .notNull()
      .references(() => companies.id),
    currency: text('currency').$type<Currency>().notNull(),
    state: text('state', { enum: ['open', 'closed'] }).notNull(),
    tier: text('tier').notNull(),
    terms: json<Terms>('terms').notNull(),
    limitMinor: minor('limit_minor').notNull(),
    countsFrom: text('counts_from', { enum: ['placement', 'dispatch'] }).notNull(),
    onHold: flag('on_hold').notNull(),
    graceDays: integer('grace_days').notNull(),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [
    oneOf('trade_accounts_state', t.state, ['open', 'closed']),
    oneOf('trade_accounts_counts_from', t.countsFrom, ['placement', 'dispatch']),
    isCurrency('trade_accounts_currency', t.currency),
    notNegative('trade_accounts_limit', t.limitMinor),
    uniqueIndex('trade_accounts_by_dealer').on(t.dealerId, t.fabricatorId),
    index('trade_accounts_by_fabricator').on(t.fabricatorId, t.id),
  ],
);

/**
 * What the ledger and the orders say of an account, kept in step inside each transaction so
 * that a credit check reads one row. `verify:ledger` compares it with what it is derived from.
 */
export const accountBalances = sqliteTable(
  'account_balances',
  {
    tradeAccountId: text('trade_account_id')
      .primaryKey()
      .references(() => tradeAccounts.id),
    receivableMinor: minor('receivable_minor').notNull(),
    unappliedMinor: minor('unapplied_minor').notNull(),
    /** orders on account placed (or, by choice, dispatched) and not yet invoiced, with tax and delivery */
    reservedMinor: minor('reserved_minor').notNull(),
  },
  (t) => [notNegative('account_balances_unapplied', t.unappliedMinor), notNegative('account_balances_reserved', t.reservedMinor)],
);

/** Ship-to book of a dealer. */
export const addresses = sqliteTable(
  'addresses',
  {
    id: id(),
    companyId: text('company_id')
      .notNull()
      .references(() => companies.id),
    label: text('label').notNull(),
    lines: json<string[]>('lines').notNull(),
    town: text('town').notNull(),
    region: text('region').notNull(),
    postcode: text('postcode').notNull(),
    country: text('country').notNull(),
    jurisdiction: text('jurisdiction').notNull(),
    zone: text('zone').notNull(),
    altitudeM: real('altitude_m'),
    position: integer('position').notNull(),
  },
  (t) => [index('addresses_by_company').on(t.companyId, t.position)],
);

export const exemptionCertificates = sqliteTable(
  'exemption_certificates',
  {
    id: id(),
    dealerId: text('dealer_id')
      .notNull()
      .references(() => companies.id),
    jurisdiction: text('jurisdiction').notNull(),
    certificate: text('certificate').notNull(),
    validFrom: day('valid_from').notNull(),
    validUntil: day('valid_until').notNull(),
  },
  (t) => [
    index('exemption_certificates_by_dealer').on(t.dealerId, t.jurisdiction),
    isDay('exemption_certificates_from', t.validFrom),
    isDay('exemption_certificates_until', t.validUntil),
  ],
);

/** Who changed what, before and after; append only (triggers). */
export const auditRows = sqliteTable(
  'audit_rows',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    companyId: text('company_id').notNull(),
    personId: text('person_id'),
    at: instant('at').notNull(),
    action: text('action').notNull(),
    subjectKind: text('subject_kind').notNull(),
    subjectId: text('subject_id').notNull(),
    before: json<unknown>('before'),
    after: json<unknown>('after'),
    reason: text('reason'),
  },
  (t) => [index('audit_rows_by_company').on(t.companyId, t.id), index('audit_rows_by_subject').on(t.subjectKind, t.subjectId)],
);
