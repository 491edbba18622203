import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type Measure } from './measure';
import { measureOrderLists } from './order-lists';
import { measurePlacing } from './placing-orders';

/** Orders placed, and their lists, in a database on disk of their own. */
export async function measureOrders(): Promise<Measure[]> {
  const folder = mkdtempSync(join(tmpdir(), 'sealyard-bench-'));
  try {
    return [...(await measurePlacing(folder)), ...(await measureOrderLists(folder))];
  } finally {
    rmSync(folder, { recursive: true });
  }
}
