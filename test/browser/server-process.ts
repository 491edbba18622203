import { type ChildProcess, spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { createServer } from 'node:net';

const BUNDLE = 'dist/sealyard/server/server.mjs';

/** The built product as a process of its own, ready for requests. */
export interface ServerProcess {
  base: string;
  /** what it has written to both of its outputs so far */
  said(): string;
  /** Asks it to end and waits until it has. @returns its exit code; null when it had to be killed */
  stop(): Promise<number | null>;
}

interface Ended {
  code: number | null;
  said: string;
}

/** Starts the built product on a data folder and waits until it is ready. @throws Error when it was not built or does not come up */
export async function startServer(dataDir: string, environment: Record<string, string> = {}): Promise<ServerProcess> {
  const port = await freePort();
  const { server, said } = spawnServer({
    PORT: String(port),
    LOCAL_SMTP_PORT: String(await freePort()),
    DATA_DIR: dataDir,
    ...environment,
  });
  const base = `http://localhost:${port}`;
  for (let waited = 0; !(await isReady(base)); waited += 100) {
    if (server.exitCode !== null) throw new Error(`The product ended at its start:\n${said()}`);
    if (waited >= 120_000) {
      server.kill('SIGKILL');
      throw new Error(`The product did not come up in two minutes:\n${said()}`);
    }
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  return { base, said, stop: () => stopServer(server) };
}

/** Starts the built product where it ought to refuse to run, and waits for its end. */
export async function startInVain(environment: Record<string, string>): Promise<Ended> {
  const { server, said } = spawnServer({ PORT: String(await freePort()), LOCAL_SMTP_PORT: String(await freePort()), ...environment });
  const hard = setTimeout(() => server.kill('SIGKILL'), 30_000);
  const code = await new Promise<number | null>((resolve) => server.once('close', resolve));
  clearTimeout(hard);
  return { code, said: said() };
}

function spawnServer(environment: Record<string, string>): { server: ChildProcess; said: () => string } {
  if (!existsSync(BUNDLE)) throw new Error('The product is not built: run "npx ng build" first.');
  const server = spawn(process.execPath, [BUNDLE], {
    env: { ...process.env, NODE_ENV: 'development', LOG_LEVEL: 'error', ...environment },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  // Whoever started it may fail before stopping it: it must neither outlive them nor keep them.
  process.once('exit', () => server.kill('SIGKILL'));
  let text = '';
  for (const output of [server.stdout, server.stderr]) output.on('data', (chunk: Buffer) => (text += chunk.toString()));
  return { server, said: () => text };
}

function isReady(base: string): Promise<boolean> {
  return fetch(`${base}/api/health`).then(
    (answer) => answer.ok,
    () => false,
  );
}

function stopServer(server: ChildProcess): Promise<number | null> {
  return new Promise((resolve) => {
    if (server.exitCode !== null) return resolve(server.exitCode);
    const hard = setTimeout(() => server.kill('SIGKILL'), 15_000);
    server.once('exit', (code) => {
      clearTimeout(hard);
      resolve(code);
    });
    server.kill('SIGTERM');
  });
}

/** A port that nobody listens on just now. */
export function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, () => {
      const address = probe.address();
      probe.close(() => (address && typeof address === 'object' ? resolve(address.port) : reject(new Error('no port'))));
    });
  });
}
