import { and, eq, sql } from 'drizzle-orm';
import { type Db } from '../database/open-database';
import { idempotencyKeys } from '../database/schema/orders';

/** Rows of idempotency keys, one answer each. */
export function idempotencyStore(db: Db) {
  const place = sql.placeholder;
  const find = db
    .select({ requestHash: idempotencyKeys.requestHash, subjectId: idempotencyKeys.subjectId })
    .from(idempotencyKeys)
    .where(and(eq(idempotencyKeys.personId, place('personId')), eq(idempotencyKeys.key, place('key'))))
    .prepare();
  const keep = db
    .insert(idempotencyKeys)
    .values({
      personId: place('personId'),
      key: place('key'),
      endpoint: place('endpoint'),
      requestHash: place('requestHash'),
      subjectId: place('subjectId'),
      createdAt: place('createdAt'),
    })
    .prepare();
  return {
    find: (personId: string, key: string) => find.get({ personId, key }),
    keep: (row: typeof idempotencyKeys.$inferInsert) => keep.run({ ...row }),
  };
}
