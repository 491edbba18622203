import { type Browser } from 'playwright-core';
import { findingsOn } from './findings';
import { type Product, START_TIMEOUT, startProduct } from './product';
import { people, type Person, screensToCheck } from './screens';
import { launchBrowser, sitDown, type Sitting } from './sitting';

jest.setTimeout(60_000);

let product: Product;
let browser: Browser;
beforeAll(async () => {
  product = await startProduct();
  browser = await launchBrowser();
}, START_TIMEOUT);
afterAll(async () => {
  await browser?.close();
  await product?.stop();
});

describe.each(Object.keys(people) as Person[])('every screen that is seen by: %s', (person) => {
  let sitting: Sitting;
  beforeAll(async () => (sitting = await sitDown(browser, product.base, people[person])));
  afterAll(() => sitting.close());

  it.each(screensToCheck(person).map((screen) => [screen.name, screen] as const))('%s', async (_name, screen) => {
    sitting.complaints.length = 0;
    expect(await findingsOn(sitting.page, screen)).toEqual([]);
    expect(sitting.complaints).toEqual([]);
  });
});
