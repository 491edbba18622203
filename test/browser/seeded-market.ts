import { cpSync, existsSync, mkdirSync, mkdtempSync, readdirSync, renameSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startServer } from './server-process';

const DAY_MS = 86_400_000;
const cache = join(tmpdir(), 'sealyard-seeded-markets');

/**
 * A data folder of one's own with a fresh demo market. The market is made once for a build and a
 * day, by starting the built product on an empty folder, and copied from then on.
 */
export async function copySeededMarket(): Promise<string> {
  const copy = mkdtempSync(join(tmpdir(), 'sealyard-'));
  cpSync(await seededMarket(), copy, { recursive: true });
  return copy;
}

/** Never to be served from: others copy it. */
async function seededMarket(): Promise<string> {
  const built = statSync('dist/sealyard/server/server.mjs').mtimeMs;
  const kept = join(cache, `${new Date().toISOString().slice(0, 10)}-${Math.round(built)}`);
  if (existsSync(kept)) return kept;
  mkdirSync(cache, { recursive: true });
  for (const old of readdirSync(cache)) {
    if (Date.now() - statSync(join(cache, old)).mtimeMs > DAY_MS) rmSync(join(cache, old), { recursive: true, force: true });
  }
  const fresh = mkdtempSync(join(cache, 'making-'));
  const server = await startServer(fresh);
  await server.stop();
  try {
    renameSync(fresh, kept);
  } catch (error) {
    // Another run was quicker; its market is the same.
    rmSync(fresh, { recursive: true, force: true });
    if (!existsSync(kept)) throw error;
  }
  return kept;
}
