import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting, type TestRequest } from '@angular/common/http/testing';
import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { type PriceRequest } from '@shared/contracts/prices';
import { type User } from '@shared/contracts/session';
import { catalogueFactory } from '../../../test/factories/catalogue-factory';
import { priceAnswerFactory } from '../../../test/factories/price-answer-factory';
import { CurrentCatalogue } from '../api-client/current-catalogue';
import { Session } from '../session/session';
import { LivePrice } from './live-price';

import { ReaderMeasures } from './reader-measures';
import { UnitDraft } from './unit-draft';

const roles = signal<User['roles']>(['buyer']);
const session = { user: signal(null), may: (id: string) => id === 'prices.price' && roles().includes('buyer') };

let price: LivePrice;
let draft: UnitDraft;
let http: HttpTestingController;

/** Lets the typing pause and more go by. */
function pass(ms: number): void {
  TestBed.tick();
  jest.advanceTimersByTime(ms);
  TestBed.tick();
}
const calls = (): TestRequest[] => http.match('/api/prices').filter((call) => !call.cancelled);
const unitPrice = () => price.offers()?.[0]?.lines[0]?.unitPrice.amount;

describe('LivePrice', () => {
  beforeEach(() => {
    jest.useFakeTimers();
    roles.set(['buyer']);
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        ReaderMeasures,
        UnitDraft,
        LivePrice,
        { provide: Session, useValue: session },
        { provide: CurrentCatalogue, useValue: { catalogue: signal(catalogueFactory()) } },
      ],
    });
    draft = TestBed.inject(UnitDraft);
    price = TestBed.inject(LivePrice);
    http = TestBed.inject(HttpTestingController);
    pass(0);
  });
  afterEach(() => jest.useRealTimers());

  it('asks once for a burst of keys, after a pause', () => {
    pass(100);
    for (const width of ['3', '36', '36 1/2']) {
      draft.type({ width });
      pass(100);
    }
    expect(calls()).toHaveLength(0);
    pass(60);
    const [call, ...more] = calls();
    expect(more).toHaveLength(0);
    expect((call!.request.body as PriceRequest).lines[0]!.unit.width).toBe('927.1');
  });

  it('shows no price as current from the first key on', () => {
    pass(150);
    calls()[0]!.flush(priceAnswerFactory('100.00'));
    expect(unitPrice()).toBe('100.00');

    draft.type({ width: '40' });
    // Not even before anything had the time to run.
    expect(price.state().is).toBe('pricing');
    expect(price.offers()).toBeNull();
    pass(150);
    calls()[0]!.flush(priceAnswerFactory('120.00'));
    expect(unitPrice()).toBe('120.00');
  });

  it('never lets an old answer take the place of a new one', () => {
    pass(150);
    const first = http.expectOne('/api/prices');
    draft.type({ width: '40' });
    pass(150);
    const second = http.expectOne(
      (request) => request.url === '/api/prices' && (request.body as PriceRequest).lines[0]!.unit.width === '1016',
    );
    expect(first.cancelled).toBe(true);
    second.flush(priceAnswerFactory('120.00'));
    expect(unitPrice()).toBe('120.00');
    pass(1000);
    expect(unitPrice()).toBe('120.00');
  });

  it('has no price while the size cannot be read, and takes up again', () => {
    pass(150);
    calls()[0]!.flush(priceAnswerFactory('100.00'));
    draft.type({ width: '36 1/' });
    expect(price.state().is).toBe('waiting');
    pass(500);
    expect(calls()).toHaveLength(0);
    draft.type({ width: '36 1/2' });
    pass(150);
    calls()[0]!.flush(priceAnswerFactory('101.00'));
    expect(unitPrice()).toBe('101.00');
  });

  it('says that it failed, and tries again when asked', () => {
    pass(150);
    calls()[0]!.flush(null, { status: 503, statusText: 'Service Unavailable' });
    expect(price.state().is).toBe('failed');
    expect(price.offers()).toBeNull();
    price.retry();
    pass(0);
    expect(price.state().is).toBe('pricing');
    pass(150);
    calls()[0]!.flush(priceAnswerFactory('100.00'));
    expect(unitPrice()).toBe('100.00');
  });

  it('tries again by itself when the connection is back', () => {
    pass(150);
    calls()[0]!.error(new ProgressEvent('error'));
    expect(price.state()).toMatchObject({ is: 'failed', problem: { status: 0 } });
    window.dispatchEvent(new Event('online'));
    pass(150);
    calls()[0]!.flush(priceAnswerFactory('100.00'));
    expect(unitPrice()).toBe('100.00');
  });

  it('does not ask again for a tag or a place, which change no price', () => {
    pass(150);
    calls()[0]!.flush(priceAnswerFactory('100.00'));
    draft.type({ tag: 'Bay, left' });
    draft.choosePlace({ door: true });
    pass(500);
    expect(calls()).toHaveLength(0);
    expect(unitPrice()).toBe('100.00');
  });

  it('asks nothing for those who have no prices', () => {
    roles.set([]);
    pass(500);
    expect(calls()).toHaveLength(0);
    expect(price.state().is).toBe('closed');
  });
});
