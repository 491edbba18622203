import { sql } from 'drizzle-orm';
import { type Db } from './open-database';
import { numberSeries } from './schema/receivables';

/** Numbers of documents, a series for each company and kind. */
export function numberSeriesStore(db: Db) {
  const take = db
    .insert(numberSeries)
    .values({ companyId: sql.placeholder('companyId'), kind: sql.placeholder('kind'), next: 2 })
    .onConflictDoUpdate({ target: [numberSeries.companyId, numberSeries.kind], set: { next: sql`${numberSeries.next} + 1` } })
    .returning({ next: numberSeries.next })
    .prepare();

  return {
    /**
     * Takes the next number of a company's series, from 1. Without gaps, provided it is called
     * inside the transaction that writes the document: a rollback gives the number back.
     */
    next: (companyId: string, kind: string): number => take.get({ companyId, kind }).next - 1,
  };
}
