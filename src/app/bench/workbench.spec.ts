import { Location } from '@angular/common';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { type PriceRequest } from '@shared/contracts/prices';
import { catalogueFactory } from '../../../test/factories/catalogue-factory';
import { priceAnswerFactory } from '../../../test/factories/price-answer-factory';
import { CurrentCatalogue } from '../api-client/current-catalogue';
import { Session } from '../session/session';
import { benchRoutes } from './bench.routes';

const visitor = null;
const buyer = { id: 'b', company: { id: 'ottery', measureSystem: 'imperial', locale: 'en-US', timeZone: 'UTC' } };
const user = signal<typeof buyer | null>(visitor);
const session = { user, may: (id: string) => user() !== null && (id.startsWith('prices.') || id.startsWith('quotes.')) };

let harness: RouterTestingHarness;
let http: HttpTestingController;
let router: Router;

const host = () => harness.routeNativeElement!;
const field = (label: string) =>
  [...host().querySelectorAll<HTMLInputElement>('input, textarea')].find((input) =>
    [...(input.labels ?? [])].some(({ textContent }) => textContent?.trim() === label),
  )!;
const button = (words: string) => [...host().querySelectorAll('button')].find(({ textContent }) => textContent?.includes(words))!;

/** Lets timers run, and the page with them. */
async function pass(ms: number): Promise<void> {
  await jest.advanceTimersByTimeAsync(ms);
  TestBed.tick();
  await jest.advanceTimersByTimeAsync(0);
}
async function type(label: string, text: string): Promise<void> {
  const input = field(label);
  input.value = text;
  input.dispatchEvent(new Event('input'));
  await pass(10);
}
async function choose(label: string, value: string): Promise<void> {
  const list = [...host().querySelectorAll('select')].find((select) => select.labels[0]?.textContent?.trim() === label)!;
  list.value = value;
  list.dispatchEvent(new Event('change'));
  await pass(10);
}

async function open(address: string): Promise<void> {
  harness = await RouterTestingHarness.create();
  const opened = harness.navigateByUrl(address);
  await pass(100);
  await opened;
  await pass(100);
}

// The first page compiles some fifty components.
jest.setTimeout(60_000);

describe('the Bench', () => {
  beforeEach(() => {
    // Everything but the microtasks that the router and its lazy routes run on.
    jest.useFakeTimers({ doNotFake: ['queueMicrotask', 'nextTick', 'requestAnimationFrame'] });
    user.set(visitor);
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([
          { path: 'bench', children: benchRoutes },
          { path: '**', children: [] },
        ]),
        { provide: Session, useValue: session },
        { provide: CurrentCatalogue, useValue: { catalogue: signal(catalogueFactory()), problem: signal(null) } },
      ],
    });
    http = TestBed.inject(HttpTestingController);
    router = TestBed.inject(Router);
    router.setUpLocationChangeListener();
  });
  afterEach(() => jest.useRealTimers());

  it('draws and evaluates the unit of the address, for visitors too, and shows no price', async () => {
    await open('/bench?size=36.5x48.25in&units=6&make=clear-3:tempered,16:argon:stainless,clear-3:tempered:low-e-soft@3');
    expect(field('Width').value).toBe('36 1/2');
    expect(field('As you would write it').value).toBe('3 temp / 16 argon / 3 temp low-e 3');
    expect(host().querySelector('app-drawing desc')!.textContent).toContain('36 1/2 in (927.1 mm) wide');
    expect(host().querySelector('app-result-strip')!.textContent).toMatch(/U-value, EN 673\s*1\.10/);
    expect(host().querySelector('app-visitor-panel')!.textContent).toContain('Sign in to see prices on your terms');
    expect(host().textContent).not.toContain('$');
  });

  it('gives every field a label, and every button a name', async () => {
    await open('/bench');
    for (const head of host().querySelectorAll<HTMLElement>('.head')) head.click();
    await pass(10);
    for (const input of host().querySelectorAll<HTMLInputElement>('input, select, textarea')) {
      expect(input.labels?.[0]?.textContent?.trim()).toBeTruthy();
    }
    for (const each of host().querySelectorAll('button')) expect(each.textContent?.trim()).toBeTruthy();
    for (const svg of host().querySelectorAll('svg[role=img]')) {
      expect(svg.getAttribute('aria-label') ?? svg.getAttribute('aria-labelledby')).toBeTruthy();
    }
  });

  it('keeps the make-up in step, as text and as layers, both ways', async () => {
    await open('/bench');
    await type('As you would write it', '6 / 12 argon / 4 / 12 air / 4 low-e 5');
    expect(host().querySelectorAll('app-layer-list li')).toHaveLength(5);
    host().querySelectorAll<HTMLElement>('app-layer-list .head')[0]!.click();
    await pass(10);
    await choose('Treatment', 'tempered');
    expect(field('As you would write it').value).toBe('6 temp / 12 argon / 4 / 12 air / 4 low-e 5');
  });

  it('keeps the last good drawing where a field cannot be read, and says so', async () => {
    await open('/bench?size=36x48in');
    await type('Width', '36 1/');
    expect(host().querySelector('app-drawing desc')!.textContent).toContain('36 in (914.4 mm) wide');
    expect(host().querySelector('app-unit-drawings')!.textContent).toContain('Shown as it last could be');
    await pass(1000);
    expect(host().querySelector('mat-error')!.textContent).toContain('is not a size');
  });

  it('replaces the address after typing, and adds to the history after a choice', async () => {
    await open('/bench');
    const location = TestBed.inject(Location);
    await pass(600);
    expect(router.url).toContain('size=36x48in');
    const go = jest.spyOn(location, 'go');
    const replace = jest.spyOn(location, 'replaceState');
    for (const width of ['3', '37', '37 1/2']) await type('Width', width);
    expect(router.url).toContain('size=36x48in');
    await pass(600);
    expect(router.url).toContain('size=37.5x48in');
    expect(go).not.toHaveBeenCalled();
    expect(replace).toHaveBeenCalledTimes(1);

    button('Swap sides').click();
    await pass(100);
    expect(go).toHaveBeenCalledTimes(1);
    expect(router.url).toContain('low-e-soft@2');
    location.back();
    await pass(100);
    expect(field('Width').value).toBe('37 1/2');
    expect(field('As you would write it').value).toBe('4 / 16 argon / 4 low-e 3');
  });

  it('says what of an address it ignored', async () => {
    await open('/bench?size=wide&maker=acme');
    expect(host().querySelector('.ignored')!.textContent).toContain('the size “wide”; the maker “acme”');
    expect(field('Width').value).toBe('36');
  });

  it('adds the line on Enter, keeps the make-up, and is ready for the next size', async () => {
    user.set(buyer);
    await open('/bench?size=36.5x48.25in&units=6&tag=Bay');
    await pass(200);
    http.expectOne('/api/prices').flush(priceAnswerFactory('184.23', { fabricator: { id: 'wide', name: 'Wide Works' } }));
    await pass(50);
    expect(host().querySelector('app-offer-card')!.textContent).toContain('$184.23');

    field('Height').dispatchEvent(new KeyboardEvent('keydown', { key: 'Enter' }));
    await pass(10);
    const { body } = http.expectOne('/api/quotes').request as { body: PriceRequest };
    expect(body).toMatchObject({
      tradeAccount: 'ottery-northmere',
      lines: [{ quantity: 6, tag: 'Bay', unit: { width: '927.1', height: '1225.55' } }],
    });
    expect(document.activeElement).toBe(field('Width'));
    expect(field('As you would write it').value).toBe('4 / 16 argon / 4 low-e 3');
  });

  it('shows nothing of an old price while a new one is on its way, and takes no line that cannot be read', async () => {
    user.set(buyer);
    await open('/bench?size=36x48in');
    await pass(200);
    http.expectOne('/api/prices').flush(priceAnswerFactory('184.23', { fabricator: { id: 'wide', name: 'Wide Works' } }));
    await pass(50);
    await type('Width', '37');
    expect(host().querySelector('app-offer-panel')!.textContent).not.toContain('$184.23');
    expect(host().querySelector('app-offer-card')!.textContent).toContain('pricing…');
    await type('Width', '37 1/');
    field('Height').dispatchEvent(new KeyboardEvent('keydown', { key: 'Enter' }));
    await pass(300);
    http.expectNone('/api/quotes');
    expect(button('Add to quote').getAttribute('aria-disabled')).toBe('true');
  });
});
