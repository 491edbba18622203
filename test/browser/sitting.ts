import { existsSync } from 'node:fs';
import { type Browser, type BrowserContextOptions, chromium, type Page } from 'playwright-core';

const CHROMIUM = '/usr/bin/chromium';

/** @param flags of Chromium, beside the usual ones. @throws Error with the command to run when Chromium is missing */
export function launchBrowser(flags: readonly string[] = []): Promise<Browser> {
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
      ...flags,
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
  const context = await browser.newContext({
    baseURL: base,
    viewport: DESK,
    locale: 'en-US',
    timezoneId: 'America/New_York',
    reducedMotion: 'reduce',
    ...options,
  });
  context.setDefaultTimeout(15_000);
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(`exception at ${page.url()}: ${error.message}`));
  page.on('console', (message) => {
    // The browser reports every refused call as an error; refusals are answers, and asserted where they matter.
    if (message.type() === 'error' && !/status of 4\d\d/.test(message.text())) {
      complaints.push(`console at ${page.url()}: ${message.text()}`);
    }
  });
  page.on('response', (response) => {
    if (response.status() >= 500) complaints.push(`${response.status()} at ${response.url()}`);
  });
  if (email) await signIn(page, email);
  return { page, complaints, close: () => context.close() };
}

/** Signs in as one does, from wherever the page stands, and waits for the place where that role begins. */
export async function signIn(page: Page, email: string): Promise<void> {
  await open(page, '/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill('made-to-size');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}

/** Opens an address and waits until the page answers to keys and clicks, not only shows. */
export async function open(page: Page, path: string): Promise<void> {
  await page.goto(path);
  await awake(page);
}

/** A page rendered by the server is marked until the client has taken over each part of it. */
export async function awake(page: Page): Promise<void> {
  await page.waitForFunction(() => document.querySelector('app-root[ng-version]') !== null && document.querySelector('[ngh]') === null);
}
