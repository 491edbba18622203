import { type SQL, sql } from 'drizzle-orm';
import { check, integer, text } from 'drizzle-orm/sqlite-core';
import { currencies } from '@shared/money/currencies';

/** Column shapes that several tables share. Tables are STRICT (see make-strict.mjs). */

export const id = () => text('id').primaryKey();
/** UTC epoch milliseconds */
export const instant = (name: string) => integer(name);
/** YYYY-MM-DD */
export const day = (name: string) => text(name);
/** whole minor units */
export const minor = (name: string) => integer(name);
export const flag = (name: string) => integer(name, { mode: 'boolean' });
export const json = <T>(name: string) => text(name, { mode: 'json' }).$type<T>();

const list = (values: readonly string[]): SQL => sql.raw(`(${values.map((value) => `'${value.replaceAll("'", "''")}'`).join(', ')})`);

/** CHECK that a text column holds one of the values. */
export const oneOf = (name: string, column: unknown, values: readonly string[]) => check(name, sql`${column} in ${list(values)}`);
export const isCurrency = (name: string, column: unknown) => oneOf(name, column, currencies);
export const isDay = (name: string, column: unknown) => check(name, sql`${column} glob '[0-9][0-9][0-9][0-9]-[0-9][0-9]-[0-9][0-9]'`);
export const notNegative = (name: string, column: unknown) => check(name, sql`${column} >= 0`);
