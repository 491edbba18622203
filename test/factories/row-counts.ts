import { sql } from 'drizzle-orm';
import { type Db } from '@api/database/open-database';

/** How many rows each table holds: equal before and after a call that wrote nothing. */
export function rowCounts(db: Db): Record<string, number> {
  const tables = db.all<{ name: string }>(sql`select name from sqlite_master where type = 'table' and name not like 'sqlite_%'`);
  return Object.fromEntries(
    tables.map(({ name }) => [name, db.get<{ rows: number }>(sql`select count(*) as rows from ${sql.identifier(name)}`).rows]),
  );
}
