import fc from 'fast-check';
import { type Destination } from '@shared/contracts/price-lists';
import { totalsSchema } from '@shared/contracts/prices';
import { aldersundList, kestrelFordList, northmereList } from '@seeds/demo/price-lists';
import { priceListFactory } from '../../../test/factories/price-list-factory';
import { totalsToWire } from './rows-to-wire';
import { taxRows } from './tax-rows';
import { type LineToTotal, totalOrder } from './total-order';

const ohio: Destination = { zone: 'local', jurisdiction: 'US-OH', exempt: false };
const line = (linePriceMinor: number, quantity = 1, weightKg: string | null = '20'): LineToTotal => ({
  linePriceMinor,
  quantity,
  weightKg,
});

function total(
  lines: LineToTotal[],
  content = northmereList,
  destination: Destination | null = ohio,
  leadTimeClass: string | null = 'usual',
) {
  const answer = totalOrder(lines, priceListFactory(content), destination, leadTimeClass);
  if ('refusals' in answer) throw new Error(JSON.stringify(answer.refusals));
  return answer.totalled;
}
const charges = (of: ReturnType<typeof total>) => of.orderCharges.map(({ label, netMinor }) => [label, netMinor]);

describe('the total of an order', () => {
  it('is goods, charges and tax', () => {
    const found = total([line(110_538, 6, '17.992')], northmereList, { ...ohio, zone: 'regional' }, 'rush');
    // 107.952 kg are 237.9934… lb at 0.04, and 45.00 flat; 1.75 % and 25 % of 1105.38.
    expect(charges(found)).toEqual([
      ['delivery, regional', 5452],
      ['Energy surcharge, 1.75 %', 1934],
      ['rush, 25 %', 27635],
    ]);
    // 7.25 % of 1455.59
    expect(found.tax).toEqual([{ label: 'Sales tax, Ohio', rate: '7.25', baseMinor: 145_559, amountMinor: 10553 }]);
    expect(found.totalMinor).toBe(156_112);
    expect(found.orderCharges.map(({ rule }) => rule)).toEqual([
      'northmere.3/orderCharges/delivery/regional',
      'northmere.3/orderCharges/surcharge',
      'northmere.3/orderCharges/rush/rush',
    ]);
  });

  it('is topped up to the minimum order', () => {
    const few = total([line(7400)]);
    expect(charges(few)).toEqual([
      ['to the minimum order of 75.00', 100],
      ['delivery, local', 2500],
      ['Energy surcharge, 1.75 %', 130],
    ]);
    expect(charges(total([line(7500)]))[0]).toEqual(['delivery, local', 2500]);
    expect(charges(total([]))).toEqual([
      ['delivery, local', 2500],
      ['Energy surcharge, 1.75 %', 0],
    ]);
  });

  it('has free delivery above the limit, not at it', () => {
    expect(charges(total([line(50_000)]))[0]).toEqual(['delivery, local', 2500]);
    expect(charges(total([line(50_001)]))[0]).toEqual(['Energy surcharge, 1.75 %', 875]);
  });

  it('has a crate for each so many units begun', () => {
    const crates = (units: number) => charges(total([line(100, units)], kestrelFordList)).at(-1);
    expect([1, 12, 13, 24, 25].map(crates)).toEqual([
      ['1 crate', 1800],
      ['1 crate', 1800],
      ['2 crates', 3600],
      ['2 crates', 3600],
      ['3 crates', 5400],
    ]);
  });

  it('weighs in kilograms where the list does', () => {
    // 100 kg at 0.35 and 190.00 flat
    expect(charges(total([line(50_000, 5, '20')], aldersundList))[0]).toEqual(['delivery, local', 22_500]);
  });

  it('refuses a zone without a rate', () => {
    expect(totalOrder([line(100)], priceListFactory(), { ...ohio, zone: 'moon' }, null)).toMatchObject({
      refusals: [{ code: 'no-rate', actual: 'moon', limit: 'local, regional, remote', pointer: '/shipTo' }],
    });
  });

  it('has no tax where the destination is exempt, unlisted or unknown, and says why', () => {
    expect(total([line(50_000)]).taxNote).toBeNull();
    const exempt = total([line(50_000)], northmereList, { ...ohio, exempt: true });
    expect([exempt.tax, exempt.taxNote]).toEqual([[], 'exempt in US-OH']);
    expect(total([line(50_000)], northmereList, { ...ohio, jurisdiction: 'US-AK' }).tax).toEqual([]);
    const nowhere = total([line(50_000)], northmereList, null);
    expect([nowhere.tax, nowhere.taxNote, charges(nowhere).map(([label]) => label)]).toEqual([
      [],
      'no destination',
      ['Energy surcharge, 1.75 %'],
    ]);
  });

  it('is taxed once per rate on the document, not line by line', () => {
    const on = ['goods'] as const;
    const content = { ...northmereList, tax: [{ jurisdiction: 'US-OH', label: 'tax', rate: '8.25', on: [...on] }] };
    const forty = total(
      Array.from({ length: 40 }, () => line(1033)),
      content,
    );
    expect(forty.tax).toEqual([{ label: 'tax', rate: '8.25', baseMinor: 41_320, amountMinor: 3409 }]);
  });

  it('sums, whatever the lines', () => {
    fc.assert(
      fc.property(
        fc.array(fc.record({ linePriceMinor: fc.integer({ min: 0, max: 5_000_000 }), quantity: fc.integer({ min: 1, max: 500 }) }), {
          maxLength: 20,
        }),
        fc.constantFrom(northmereList, kestrelFordList, aldersundList),
        fc.constantFrom('local', 'regional', 'remote'),
        fc.boolean(),
        (lines, content, zone, exempt) => {
          const found = total(
            lines.map((of) => ({ ...of, weightKg: '12.345' })),
            content,
            { zone, jurisdiction: 'US-IL', exempt },
            'rush',
          );
          const sum = (minors: number[]) => minors.reduce((a, b) => a + b, 0);
          const goods = sum(lines.map(({ linePriceMinor }) => linePriceMinor));
          expect(found.goodsMinor).toBe(goods);
          expect(found.totalMinor).toBe(
            goods + sum(found.orderCharges.map(({ netMinor }) => netMinor)) + sum(found.tax.map(({ amountMinor }) => amountMinor)),
          );
          expect(totalsSchema.safeParse(totalsToWire(found)).success).toBe(true);
        },
      ),
    );
  });
});

describe('tax', () => {
  it('of a credit note mirrors that of its invoice', () => {
    const amount = fc.integer({ min: -10_000_000, max: 10_000_000 });
    fc.assert(
      fc.property(amount, amount, (goodsMinor, deliveryMinor) => {
        const charged = taxRows(aldersundList, 'US-OH', { goodsMinor, charges: [{ family: 'delivery', netMinor: deliveryMinor }] });
        const credited = taxRows(aldersundList, 'US-OH', {
          goodsMinor: -goodsMinor,
          charges: [{ family: 'delivery', netMinor: -deliveryMinor }],
        });
        expect(credited.map(({ amountMinor }) => amountMinor + 0)).toEqual(charged.map(({ amountMinor }) => 0 - amountMinor));
      }),
    );
    const on = ['goods'] as const;
    const half = { tax: [{ jurisdiction: 'X', label: 'tax', rate: '5', on: [...on] }] };
    const amountOf = (goodsMinor: number) => taxRows(half, 'X', { goodsMinor, charges: [] })[0]?.amountMinor;
    expect([amountOf(10), amountOf(-10)]).toEqual([1, -1]);
  });
});
