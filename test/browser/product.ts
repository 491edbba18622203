import { type ChildProcess, spawn } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type Browser, type BrowserContextOptions, chromium, type Page } from 'playwright-core';

/** The built product, served from a folder of its own with a fresh demo market. */
export interface Product {
  base: string;
  stop(): Promise<void>;
}

const BUNDLE = 'dist/sealyard/server/server.mjs';

/** Starts the built product and waits until it is ready. @throws Error when it was not built or does not come up */
export async function startProduct(environment: Record<string, string> = {}): Promise<Product> {
  if (!existsSync(BUNDLE)) throw new Error('The product is not built: run "npx ng build" first.');
  const data = mkdtempSync(join(tmpdir(), 'sealyard-'));
  const [port, smtp] = [await freePort(), await freePort()];
  const base = `http://localhost:${port}`;
  const server = spawn(process.execPath, [BUNDLE], {
    env: {
      ...process.env,
      NODE_ENV: 'development',
      PORT: String(port),
      LOCAL_SMTP_PORT: String(smtp),
      DATA_DIR: data,
      LOG_LEVEL: 'error',
      ...environment,
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let said = '';
  server.stdout.on('data', (chunk: Buffer) => (said += chunk.toString()));
  server.stderr.on('data', (chunk: Buffer) => (said += chunk.toString()));
  await ready(base, server, () => said);
  return {
    base,
    stop: async () => {
      await stopped(server);
      rmSync(data, { recursive: true, force: true });
    },
  };
}

async function ready(base: string, server: ChildProcess, said: () => string): Promise<void> {
  for (let waited = 0; waited < 90_000; waited += 250) {
    if (server.exitCode !== null) throw new Error(`The product ended at its start:\n${said()}`);
    const healthy = await fetch(`${base}/api/health`).then(
      (answer) => answer.ok,
      () => false,
    );
    if (healthy) return;
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
  server.kill('SIGKILL');
  throw new Error(`The product did not come up in 90 s:\n${said()}`);
}

function stopped(server: ChildProcess): Promise<void> {
  return new Promise((resolve) => {
    if (server.exitCode !== null) return resolve();
    const hard = setTimeout(() => server.kill('SIGKILL'), 15_000);
    server.once('exit', () => {
      clearTimeout(hard);
      resolve();
    });
    server.kill('SIGTERM');
  });
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, () => {
      const address = probe.address();
      probe.close(() => (address && typeof address === 'object' ? resolve(address.port) : reject(new Error('no port'))));
    });
  });
}

const CHROMIUM = '/usr/bin/chromium';

/** @throws Error with the command to run when Chromium is missing */
export function launchBrowser(): Promise<Browser> {
  if (!existsSync(CHROMIUM)) throw new Error('The browser tests need Chromium: apt-get install chromium');
  return chromium.launch({
    executablePath: CHROMIUM,
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

export const DESK = { width: 1280, height: 880 };
export const PHONE = { width: 390, height: 844 };

export interface Sitting {
  page: Page;
  /** errors the page reported: exceptions, console errors, answers of 500 and above */
  complaints: string[];
  close(): Promise<void>;
}

/** A page of a browser of its own, signed in as someone or as a visitor. */
export async function sitDown(browser: Browser, base: string, email: string | null, options: BrowserContextOptions = {}): Promise<Sitting> {
  const context = await browser.newContext({ viewport: DESK, locale: 'en-US', timezoneId: 'America/New_York', ...options });
  context.setDefaultTimeout(15_000);
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(`exception: ${error.message}`));
  page.on('console', (message) => {
    // The browser reports every refused call as an error; refusals are answers, and asserted where they matter.
    if (message.type() === 'error' && !/status of 4\d\d/.test(message.text())) complaints.push(`console: ${message.text()}`);
  });
  page.on('response', (response) => {
    if (response.status() >= 500) complaints.push(`${response.status()} at ${response.url()}`);
  });
  if (email) {
    await page.goto(`${base}/sign-in`);
    await page.getByLabel('E-mail').fill(email);
    await page.getByLabel('Password').fill('made-to-size');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
  }
  return { page, complaints, close: () => context.close() };
}
