import { rmSync } from 'node:fs';
import { copySeededMarket } from './seeded-market';
import { startServer } from './server-process';

/** The built product, served from a folder of its own with a fresh demo market. */
export interface Product {
  base: string;
  stop(): Promise<void>;
}

/** What a start may take on a busy machine where the market is still to be made, ms. */
export const START_TIMEOUT = 240_000;

/** Starts the built product and waits until it is ready. @throws Error when it was not built or does not come up */
export async function startProduct(environment: Record<string, string> = {}): Promise<Product> {
  const data = await copySeededMarket();
  const server = await startServer(data, environment);
  return {
    base: server.base,
    stop: async () => {
      await server.stop();
      rmSync(data, { recursive: true, force: true });
    },
  };
}
