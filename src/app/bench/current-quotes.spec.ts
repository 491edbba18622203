import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { type LineInput } from '@shared/contracts/prices';
import { type Quote } from '@shared/contracts/quotes';
import { unitFactory } from '../../../test/factories/catalogue-factory';
import { offerFactory } from '../../../test/factories/price-answer-factory';
import { Session } from '../session/session';
import { CurrentQuotes } from './current-quotes';

const usd = (amount: string) => ({ amount, currency: 'USD' as const });
const line: LineInput = { unit: unitFactory(), quantity: 6, tag: 'Bay, left' };

function quote(id: string, tradeAccount: string, lines: number, state: Quote['state'] = 'open'): Quote {
  const [priced] = offerFactory('184.23').lines;
  return {
    id,
    number: `Q-${id}`,
    state,
    tradeAccount,
    fabricator: { id: 'northmere', name: 'Northmere Sealed Units' },
    currency: 'USD',
    customer: null,
    markUpPercent: '0',
    notes: '',
    validUntil: '2026-10-15',
    createdAt: '2026-09-15T15:00:00Z',
    updatedAt: '2026-09-15T15:00:00Z',
    createdBy: 'A buyer',
    units: lines,
    total: usd('184.23'),
    order: null,
    revision: lines,
    priceListVersion: 'northmere.3',
    priceList: { name: 'Northmere trade list', effectiveFrom: '2026-09-01T00:00:00Z' },
    pricedAt: '2026-09-15T15:00:00Z',
    shipTo: null,
    leadTimeDays: 8,
    earliestOn: '2026-03-17',
    lines: Array.from({ length: lines }, (_, i) => ({
      ...priced!,
      id: `line-${i + 1}`,
      position: i + 1,
      tag: 'Bay, left',
      unit: line.unit,
      quantity: 6,
      extras: [],
      makeUp: '3 temp / 16 argon / 3 temp low-e 3',
      retail: { unitPrice: usd('184.23'), linePrice: usd('1105.38') },
    })),
    goods: usd('184.23'),
    orderCharges: [],
    tax: [],
    retailGoods: usd('184.23'),
    mails: [],
  };
}

const company = signal('ottery');
const signedIn = signal(true);
let quotes: CurrentQuotes;
let http: HttpTestingController;

describe('CurrentQuotes', () => {
  beforeEach(() => {
    company.set('ottery');
    signedIn.set(true);
    const session = { user: () => ({ company: { id: company() } }), may: () => signedIn() };
    TestBed.configureTestingModule({
      providers: [provideHttpClient(), provideHttpClientTesting(), CurrentQuotes, { provide: Session, useValue: session }],
    });
    quotes = TestBed.inject(CurrentQuotes);
    http = TestBed.inject(HttpTestingController);
  });
  afterEach(() => http.verify());

  it('begins a quote with the first line and adds the next to it', () => {
    quotes.add(line, 'at-northmere');
    expect(quotes.adding()).toBe(true);
    const begun = http.expectOne('/api/quotes');
    expect(begun.request.body).toEqual({ tradeAccount: 'at-northmere', lines: [line] });
    begun.flush(quote('a', 'at-northmere', 1), { status: 201, statusText: 'Created' });
    expect(quotes.adding()).toBe(false);
    expect(quotes.added()).toMatchObject({ began: true, quote: { number: 'Q-a', lines: 1 } });

    quotes.add(line, 'at-northmere');
    http.expectOne('/api/quotes/a/lines').flush(quote('a', 'at-northmere', 2));
    expect(quotes.at('at-northmere')).toMatchObject({ id: 'a', lines: 2 });
  });

  it('begins one quote, not two, for quick hands', () => {
    quotes.add(line, 'at-northmere');
    quotes.add({ ...line, quantity: 2 }, 'at-northmere');
    http.expectOne('/api/quotes').flush(quote('a', 'at-northmere', 1));
    http.expectOne('/api/quotes/a/lines').flush(quote('a', 'at-northmere', 2));
    expect(quotes.ids()).toEqual(['a']);
  });

  it('keeps one quote for each maker', () => {
    quotes.add(line, 'at-northmere');
    http.expectOne('/api/quotes').flush(quote('a', 'at-northmere', 1));
    quotes.add(line, 'at-kestrel-ford');
    http.expectOne('/api/quotes').flush(quote('b', 'at-kestrel-ford', 1));
    quotes.add(line, 'at-northmere');
    http.expectOne('/api/quotes/a/lines').flush(quote('a', 'at-northmere', 2));
    expect([...quotes.ids()].sort()).toEqual(['a', 'b']);
  });

  it('begins another where the quote was ordered meanwhile', () => {
    quotes.add(line, 'at-northmere');
    http.expectOne('/api/quotes').flush(quote('a', 'at-northmere', 1));
    quotes.add(line, 'at-northmere');
    http
      .expectOne('/api/quotes/a/lines')
      .flush({ type: '/problems/not-in-this-state', title: '', status: 409, detail: 'ordered' }, { status: 409, statusText: 'Conflict' });
    http.expectOne('/api/quotes').flush(quote('b', 'at-northmere', 1));
    expect(quotes.added()).toMatchObject({ began: true, quote: { id: 'b' } });
    expect(quotes.problem()).toBeNull();
    expect(quotes.ids()).toEqual(['b']);
  });

  it('says why a line was not added, and goes on with the next', () => {
    quotes.add(line, 'at-northmere');
    http.expectOne('/api/quotes').error(new ProgressEvent('error'));
    expect(quotes.problem()).toMatchObject({ status: 0 });
    expect(quotes.added()).toBeNull();
    quotes.add(line, 'at-northmere');
    expect(quotes.problem()).toBeNull();
    http.expectOne('/api/quotes').flush(quote('a', 'at-northmere', 1));
    expect(quotes.added()).not.toBeNull();
  });

  it('takes up the open quotes of an address, and no others', () => {
    quotes.use(['a', 'b', 'c', '../x']);
    TestBed.tick();
    expect(quotes.ids()).toEqual(['a', 'b', 'c']);
    http.expectOne('/api/quotes/a').flush(quote('a', 'at-northmere', 3));
    http.expectOne('/api/quotes/b').flush(quote('b', 'at-kestrel-ford', 1, 'ordered'));
    http.expectOne('/api/quotes/c').flush({}, { status: 404, statusText: 'Not Found' });
    expect(quotes.ids()).toEqual(['a']);
    expect(quotes.at('at-northmere')).toMatchObject({ lines: 3 });
    expect(quotes.refused()).toBe(true);
  });

  it('keeps the quotes of an address until somebody is signed in', () => {
    signedIn.set(false);
    quotes.use(['a']);
    TestBed.tick();
    http.expectNone('/api/quotes/a');
    expect(quotes.ids()).toEqual(['a']);
    signedIn.set(true);
    TestBed.tick();
    http.expectOne('/api/quotes/a').flush(quote('a', 'at-northmere', 3));
    expect(quotes.at('at-northmere')).toMatchObject({ id: 'a' });
    expect(quotes.refused()).toBe(false);
  });

  it('shows nothing of one company to another', () => {
    quotes.add(line, 'at-northmere');
    http.expectOne('/api/quotes').flush(quote('a', 'at-northmere', 1));
    company.set('perrin');
    expect(quotes.at('at-northmere')).toBeUndefined();
    expect(quotes.ids()).toEqual([]);
  });
});
