import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { quoteFactory } from '../../../test/factories/quote-factory';
import { QuotesPage } from './quotes-page';

describe('QuotesPage', () => {
  let http: HttpTestingController;
  let page: RouterTestingHarness;
  beforeEach(async () => {
    jest.useFakeTimers();
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([{ path: 'quotes', component: QuotesPage }], withComponentInputBinding()),
      ],
    });
    http = TestBed.inject(HttpTestingController);
    page = await RouterTestingHarness.create();
  });
  afterEach(() => {
    http.verify();
    jest.useRealTimers();
  });

  /** Answers the list that is asked for now; its query. */
  function answer(quotes: unknown[] = []): Record<string, string> {
    const { request, flush } = take();
    flush(quotes);
    return Object.fromEntries(request.params.keys().map((key) => [key, request.params.get(key)!]));
  }
  function take() {
    const call = http.expectOne(({ url }) => url === '/api/quotes');
    return { request: call.request, flush: (items: unknown[]) => call.flush({ items, nextCursor: null }) };
  }
  const text = () => page.routeNativeElement!.textContent!;
  const settle = async () => {
    await jest.runAllTimersAsync();
    page.detectChanges();
  };

  it('reads search and state from the address, so that reload and a link keep them', async () => {
    await page.navigateByUrl('/quotes?q=hale&state=expired', QuotesPage);
    expect(answer()).toEqual({ q: 'hale', state: 'expired' });
    await settle();
    expect(page.routeNativeElement!.querySelector('input')!.value).toBe('hale');
    expect(page.routeNativeElement!.querySelector('select')!.value).toBe('expired');
    expect(text()).toContain('No quote fits');
  });

  it('leaves out a state that there is not', async () => {
    await page.navigateByUrl('/quotes?state=lost', QuotesPage);
    expect(answer()).toEqual({});
  });

  it('writes into the address what is searched for, after a pause in typing, and asks once', async () => {
    await page.navigateByUrl('/quotes?state=open', QuotesPage);
    answer([quoteFactory()]);
    await settle();
    expect(text()).toContain('Q-000012');

    const input = page.routeNativeElement!.querySelector('input')!;
    for (const typed of ['b', 'ba', 'bay']) {
      input.value = typed;
      input.dispatchEvent(new Event('input'));
      await jest.advanceTimersByTimeAsync(100);
    }
    expect(TestBed.inject(Router).url).toBe('/quotes?state=open');
    await jest.advanceTimersByTimeAsync(400);
    page.detectChanges();
    expect(TestBed.inject(Router).url).toBe('/quotes?state=open&q=bay');
    expect(answer()).toEqual({ q: 'bay', state: 'open' });
  });

  it('says what to do first where there is nothing yet', async () => {
    await page.navigateByUrl('/quotes', QuotesPage);
    answer();
    await settle();
    expect(text()).toContain('No quotes yet');
    expect(page.routeNativeElement!.querySelector('.empty a')!.getAttribute('href')).toBe('/bench');
  });
});
