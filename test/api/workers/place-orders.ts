import { once } from 'node:events';
import { join } from 'node:path';
import { readConfig } from '@api/config';
import { type Member } from '@api/companies/actor';
import { createDependencies } from '@api/dependencies';
import { placeOrder } from '@api/orders/place-order';

/**
 * A server process of its own: opens the database under DATA_DIR, says that it is ready, and on
 * a word orders each quote it was given and says how each went.
 */
const { quotes, actor, at } = JSON.parse(process.argv[2] ?? '') as { quotes: string[]; actor: Member; at: number };
const dependencies = createDependencies(readConfig(process.env), join(process.cwd(), 'api/database/migrations'), { clock: () => at });
dependencies.catalogue();
console.log('ready');
await once(process.stdin, 'data');
const answers = quotes.map((id) => {
  try {
    const body = { poNumber: 'PO', shipTo: 'ottery.place-1', payment: 'account' as const };
    return placeOrder(actor, { params: { id }, body, idempotencyKey: `key-of-${id}` }, dependencies).state;
  } catch (error) {
    return (error as { code?: string }).code ?? String(error);
  }
});
dependencies.database.close();
console.log(JSON.stringify(answers));
process.exit(0);
