import { type Page } from 'playwright-core';
import { catalogueParts } from '@shared/contracts/catalogue-parts';

/** One of each kind of reader, by the demo sign-in; null: nobody is signed in. */
export const people = {
  visitor: null,
  buyer: 'buyer@ottery.example',
  'dealer admin': 'admin@ottery.example',
  sales: 'sales@northmere.example',
  accounts: 'accounts@northmere.example',
  plant: 'plant@northmere.example',
  'fabricator admin': 'admin@northmere.example',
  operator: 'operator@sealyard.example',
} as const satisfies Record<string, string | null>;
export type Person = keyof typeof people;

/** Reads JSON from the API as whoever is signed in on the page. */
export type Read = <T>(path: string) => Promise<T>;

export interface Screen {
  /** fit for a file name */
  name: string;
  seenBy: readonly Person[];
  /** its address, found from what is there */
  path: string | ((read: Read) => Promise<string>);
  /** the level 1 heading once it is there */
  heading: RegExp;
  /** what is done on it before it is looked at, such as opening a dialog */
  then?: (page: Page) => Promise<void>;
  /** whether it can be there with no data at all */
  hasNone?: boolean;
  /** where nobody needs to sign in */
  isPublic?: boolean;
}

interface Found {
  id: string;
}
interface Item extends Found {
  number: string;
}

const everyone = Object.keys(people) as Person[];
const dealer = ['buyer', 'dealer admin'] as const;
const fabricator = ['sales', 'accounts', 'plant', 'fabricator admin'] as const;
const clerks = ['accounts', 'fabricator admin'] as const;
const plant = ['plant', 'fabricator admin'] as const;

const shownTo = (seenBy: readonly Person[], list: Omit<Screen, 'seenBy'>[]): Screen[] => list.map((screen) => ({ ...screen, seenBy }));

/** The address of the first thing that a list answers. @throws Error when it is empty: then the screen cannot be seen */
const first =
  (list: string, to: (id: string) => string) =>
  async (read: Read): Promise<string> => {
    const [found] = (await read<{ items: Found[] }>(list)).items;
    if (!found) throw new Error(`${list} is empty`);
    return to(found.id);
  };

const press = (name: string | RegExp) => async (page: Page) => {
  await page.getByRole('button', { name }).first().click();
  await page.getByRole('dialog').waitFor();
};
/** Opens the drawings and the charge sheet of the first line, and a row of the sheet. */
const openLine = async (page: Page) => {
  await page
    .getByRole('button', { name: /^Drawings and charge sheet of/ })
    .filter({ visible: true })
    .first()
    .click();
  await page.getByRole('table', { name: /charges for each unit/i }).waitFor();
  await page
    .getByRole('table', { name: /charges for each unit/i })
    .getByRole('button')
    .first()
    .click();
};

const example = '/bench?size=36.5x48.25in&units=6&make=clear-3:tempered,16:argon:stainless,clear-3:tempered:low-e-soft@3';
const triple =
  '/bench?size=927x1226mm&make=clear-4:tempered:low-e-soft@2,14:krypton:warm-edge,clear-4:annealed,14:krypton:warm-edge,clear-4:tempered:low-e-soft@5&place=door:yes,bottom:200mm,top:2000mm';

const publicScreens = shownTo(everyone, [
  { name: 'front', path: '/', heading: /Sealed units, made to size/, hasNone: true },
  { name: 'catalogue', path: '/catalogue', heading: /Catalogue/, hasNone: true },
  { name: 'how-a-unit-is-made', path: '/catalogue/how-a-unit-is-made', heading: /How a sealed unit is made/ },
  { name: 'sizes', path: '/catalogue/sizes', heading: /./ },
  { name: 'questions', path: '/catalogue/questions', heading: /./ },
  { name: 'makers', path: '/catalogue/makers', heading: /./, hasNone: true },
  { name: 'maker', path: '/catalogue/makers/northmere', heading: /Northmere/ },
  ...catalogueParts.flatMap(({ slug, key }) => [
    { name: slug, path: `/catalogue/${slug}`, heading: /./ },
    {
      name: `${slug}-item`,
      path: async (read: Read) => {
        const [item] = (await read<Record<string, Found[]>>('/api/catalogue'))[key] ?? [];
        return `/catalogue/${slug}/${item!.id}`;
      },
      heading: /./,
    },
  ]),
  { name: 'not-in-the-catalogue', path: '/catalogue/glass/none-such', heading: /./ },
  { name: 'catalogue-out-of-reach', path: '/catalogue/out-of-reach', heading: /./ },
  { name: 'bench', path: example, heading: /Bench/, hasNone: true },
  { name: 'bench-triple', path: triple, heading: /Bench/ },
  {
    name: 'bench-too-large',
    path: '/bench?size=200x190in',
    heading: /Bench/,
  },
  {
    name: 'bench-wrong-size',
    path: example,
    heading: /Bench/,
    then: async (page: Page) => {
      await page.getByRole('textbox', { name: 'Width', exact: true }).fill('36 1/');
      await page.getByRole('textbox', { name: 'Width', exact: true }).press('Tab');
      await page.getByText(/as it last could be/).waitFor();
    },
  },
  {
    name: 'bench-open-layers',
    path: example,
    heading: /Bench/,
    then: async (page: Page) => {
      await page
        .getByRole('region', { name: 'Size and make-up' })
        .getByRole('button', { name: /lite 2/ })
        .click();
      await page.getByRole('button', { name: /^Doors, wet areas/ }).click();
      await page.getByText('How these are found').click();
    },
  },
  { name: 'bench-keys', path: example, heading: /Bench/, then: press(/^Keys/) },
  { name: 'sign-in', path: '/sign-in', heading: /Sign in/ },
  { name: 'nothing-here', path: '/no-such-place', heading: /./ },
]).map((screen) => ({ ...screen, isPublic: true }));

const dealerScreens = shownTo(dealer, [
  { name: 'quotes', path: '/quotes', heading: /Quotes/, hasNone: true },
  { name: 'quotes-nothing-fits', path: '/quotes?q=none-such', heading: /Quotes/ },
  { name: 'quote-open', path: first('/api/quotes?state=open&limit=1', (id) => `/quotes/${id}`), heading: /^Quote/ },
  { name: 'quote-open-line', path: first('/api/quotes?state=open&limit=1', (id) => `/quotes/${id}`), heading: /^Quote/, then: openLine },
  { name: 'quote-mail', path: first('/api/quotes?state=open&limit=1', (id) => `/quotes/${id}`), heading: /^Quote/, then: press('Mail') },
  { name: 'quote-expired', path: first('/api/quotes?state=expired&limit=1', (id) => `/quotes/${id}`), heading: /^Quote/ },
  {
    name: 'quote-re-price',
    path: first('/api/quotes?state=expired&limit=1', (id) => `/quotes/${id}`),
    heading: /^Quote/,
    then: press(/today’s prices/i),
  },
  { name: 'quote-ordered', path: first('/api/quotes?state=ordered&limit=1', (id) => `/quotes/${id}`), heading: /^Quote/ },
  { name: 'order-a-quote', path: first('/api/quotes?state=open&limit=1', (id) => `/quotes/${id}/order`), heading: /^Order from/ },
  { name: 'money', path: '/money', heading: /Money/, hasNone: true },
  { name: 'money-invoice-open', path: first('/api/invoices?state=open&limit=1', (id) => `/money/invoices/${id}`), heading: /^Invoice/ },
  { name: 'money-invoice-paid', path: first('/api/invoices?state=paid&limit=1', (id) => `/money/invoices/${id}`), heading: /^Invoice/ },
]);

const orderScreens = shownTo(
  [...dealer, ...fabricator],
  [
    { name: 'orders', path: '/orders', heading: /Orders/, hasNone: true },
    { name: 'orders-nothing-fits', path: '/orders?q=none-such', heading: /Orders/ },
    ...(['submitted', 'in production', 'closed', 'cancelled'] as const).map((state) => ({
      name: `order-${state.replace(' ', '-')}`,
      path: first(`/api/orders?state=${encodeURIComponent(state)}&limit=1`, (id) => `/orders/${id}`),
      heading: /^Order/,
    })),
    { name: 'order-line', path: first('/api/orders?limit=1', (id) => `/orders/${id}`), heading: /^Order/, then: openLine },
  ],
);

const plantScreens = shownTo(plant, [
  { name: 'plant', path: '/plant', heading: /To make/, hasNone: true },
  {
    name: 'plant-dispatch',
    path: first(`/api/orders?state=${encodeURIComponent('in production')}&limit=1`, (id) => `/plant/orders/${id}`),
    heading: /^Order/,
    then: async (page: Page) => {
      await page.getByRole('checkbox', { name: 'Tick all' }).check();
    },
  },
  {
    name: 'plant-nothing-left',
    path: first('/api/orders?state=closed&limit=1', (id) => `/plant/orders/${id}`),
    heading: /^Order/,
  },
]);

const openInvoice = async (read: Read) => {
  const [invoice] = (await read<{ items: (Item & { tradeAccount: string })[] }>('/api/invoices?state=open&limit=1')).items;
  return invoice!;
};
const clerkScreens = shownTo(clerks, [
  { name: 'receivables-invoices', path: '/receivables/invoices', heading: /Invoices/, hasNone: true },
  {
    name: 'receivables-invoice-open',
    path: async (read: Read) => `/receivables/invoices/${(await openInvoice(read)).id}`,
    heading: /^Invoice/,
  },
  {
    name: 'receivables-invoice-paid',
    path: first('/api/invoices?state=paid&limit=1', (id) => `/receivables/invoices/${id}`),
    heading: /^Invoice/,
  },
  { name: 'receivables-receipts', path: '/receivables/receipts', heading: /Receipts/, hasNone: true },
  { name: 'receivables-receipt', path: first('/api/receipts?limit=1', (id) => `/receivables/receipts/${id}`), heading: /^Receipt/ },
  {
    name: 'receivables-receipt-reverse',
    path: first('/api/receipts?limit=1', (id) => `/receivables/receipts/${id}`),
    heading: /^Receipt/,
    then: press('Reverse receipt'),
  },
  { name: 'receivables-record', path: '/receivables/receipts/new', heading: /Record a receipt/, hasNone: true },
  {
    name: 'receivables-record-for-invoice',
    path: async (read: Read) => {
      const { id, tradeAccount } = await openInvoice(read);
      return `/receivables/receipts/new?account=${tradeAccount}&invoice=${id}`;
    },
    heading: /Record a receipt/,
  },
  { name: 'receivables-accounts', path: '/receivables/accounts', heading: /Trade accounts/, hasNone: true },
  { name: 'receivables-account', path: '/receivables/accounts/ottery.northmere', heading: /Ottery/ },
  { name: 'receivables-limit', path: '/receivables/accounts/ottery.northmere', heading: /Ottery/, then: press('Change limit') },
  { name: 'trial-balance', path: '/receivables/trial-balance', heading: /Trial balance/, hasNone: true },
]);

/** Every screen there is, in the states that look different, and who sees it. */
export const screens: readonly Screen[] = [
  ...publicScreens,
  ...dealerScreens,
  { name: 'money-movements', path: '/money/accounts/ottery.northmere', heading: /^Account at/, seenBy: ['dealer admin'], hasNone: true },
  ...orderScreens,
  ...plantScreens,
  ...clerkScreens,
  { name: 'market', path: '/market', heading: /./, seenBy: ['operator'], hasNone: true },
];

/**
 * The screens worth checking as someone: those that need a sign-in, the Bench, which shows prices
 * to some, and the front page for its head. The other public pages are the same for everybody.
 */
export function screensToCheck(person: Person): Screen[] {
  return screens.filter(
    ({ seenBy, isPublic, name }) =>
      seenBy.includes(person) &&
      (person === 'visitor' || !isPublic || name === 'front' || (person === 'buyer' && name.startsWith('bench'))),
  );
}
