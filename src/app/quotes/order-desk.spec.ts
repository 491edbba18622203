import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting, type TestRequest } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { OrderDesk } from './order-desk';

const asked = { poNumber: 'PO 17', shipTo: 'yard', payment: 'account' as const, accepted: '1105.38' };
const url = '/api/quotes/q1/order';
const keyOf = ({ request }: TestRequest) => request.headers.get('Idempotency-Key');
const refuse = (request: TestRequest, status: number, code: string) =>
  request.flush({ type: `https://sealyard.example/problems/${code}`, title: code, status, detail: 'No.' }, { status, statusText: code });

describe('OrderDesk', () => {
  let desk: OrderDesk;
  let http: HttpTestingController;
  beforeEach(() => {
    TestBed.configureTestingModule({ providers: [OrderDesk, provideHttpClient(), provideHttpClientTesting()] });
    desk = TestBed.inject(OrderDesk);
    http = TestBed.inject(HttpTestingController);
  });
  afterEach(() => http.verify());

  it('sends one call for a double click', () => {
    desk.place('q1', asked);
    desk.place('q1', asked);
    expect(http.match(url)).toHaveLength(1);
    expect(desk.placing()).toBe(true);
  });

  it('asks again under the same key when the connection broke, so that the order exists once', () => {
    desk.place('q1', asked);
    const first = http.expectOne(url);
    first.error(new ProgressEvent('error'));
    expect(desk.problem()?.status).toBe(0);
    expect(desk.placing()).toBe(false);

    desk.place('q1', asked);
    const second = http.expectOne(url);
    expect(keyOf(first)).toMatch(/^[0-9a-f]{32}$/);
    expect(keyOf(second)).toBe(keyOf(first));
  });

  it.each([
    [500, 'unexpected'],
    [503, 'unavailable'],
    [409, 'in-progress'],
  ])('keeps the key after %i %s, which leaves it open whether the order arrived', (status, code) => {
    desk.place('q1', asked);
    const first = http.expectOne(url);
    refuse(first, status, code);
    desk.place('q1', asked);
    expect(keyOf(http.expectOne(url))).toBe(keyOf(first));
  });

  it('begins a new attempt after a clear refusal', () => {
    desk.place('q1', asked);
    const first = http.expectOne(url);
    refuse(first, 409, 'over-credit');
    expect(desk.problem()?.code).toBe('over-credit');

    desk.place('q1', { ...asked, review: true });
    expect(desk.problem()).toBeNull();
    expect(keyOf(http.expectOne(url))).not.toBe(keyOf(first));
  });

  it('never sends another order under a key that is in doubt', () => {
    desk.place('q1', asked);
    const first = http.expectOne(url);
    first.error(new ProgressEvent('error'));
    desk.place('q1', { ...asked, poNumber: 'PO 18' });
    expect(keyOf(http.expectOne(url))).not.toBe(keyOf(first));
  });
});
