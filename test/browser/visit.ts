import { type Page } from 'playwright-core';
import { type Read, type Screen } from './screens';
import { open } from './sitting';

/** Reads JSON from the API as whoever is signed in on the page. @throws Error for any answer but a good one */
export const readAs =
  (page: Page): Read =>
  async <T>(path: string) => {
    const answer = await page.request.get(path);
    if (!answer.ok()) throw new Error(`${answer.status()} at ${path}`);
    return (await answer.json()) as T;
  };

/** Goes to a screen and waits until it shows what it is about. */
export async function visit(page: Page, screen: Screen): Promise<void> {
  await open(page, typeof screen.path === 'string' ? screen.path : await screen.path(readAs(page)));
  await page.getByRole('heading', { level: 1, name: screen.heading }).first().waitFor({ state: 'attached' });
  await settled(page);
  await screen.then?.(page);
  await settled(page);
}

/** Waits until no part of the page is still being read, and nothing moves. */
export async function settled(page: Page): Promise<void> {
  await page.waitForFunction(
    () =>
      document.querySelector('.sy-waiting') === null &&
      document.querySelector('main [aria-busy="true"]') === null &&
      document.getAnimations().every(({ playState }) => playState !== 'running'),
  );
  await page.evaluate(() => document.fonts.ready.then(() => undefined));
}
