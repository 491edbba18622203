import fc from 'fast-check';
import { areaFamilies, type PriceListContent, priceListContent, type PriceTerms } from '@shared/contracts/price-lists';
import { chargeSchema, pricedLine } from '@shared/contracts/prices';
import { makeUpKey } from '@shared/glazing/make-up-key';
import { type Currency } from '@shared/money/currencies';
import { Exact, exact } from '@shared/money/exact';
import { percentOf, roundToMinor } from '@shared/money/money';
import { aldersundList, kestrelFordList, northmereList, raise } from '@seeds/demo/price-lists';
import { catalogueFactory, unitFactory } from '../../../test/factories/catalogue-factory';
import { lineFactory, wideSpread } from '../../../test/factories/line-factory';
import { priceListFactory, pricedUnitFactory as priced, priceTermsFactory } from '../../../test/factories/price-list-factory';
import { partOf, wholeMinor } from './charge';
import { versionInForce } from './in-force';
import { priceLines } from './price-lines';
import { type LineToPrice, type PricedUnit, priceUnit } from './price-unit';
import { lineToWire } from './rows-to-wire';

/** What holds for every list, unit and dealer. */

const catalogue = catalogueFactory();
const lists = [northmereList, kestrelFordList, aldersundList];
const anyList = fc.constantFrom(...lists.map((content) => priceListFactory(content)));
const anyTier = fc.constantFrom('A', 'B', 'C', 'none');
const seed = fc.integer({ min: 1, max: 1_000_000 });

/** Terms of every kind, for the make-up of one line among others. */
const anyTerms = (makeUp: string): fc.Arbitrary<PriceTerms> =>
  fc.record({
    tier: anyTier,
    contracts: fc.subarray([
      { id: 'c1', kind: 'percent' as const, family: 'glass' as const, percent: '17.5', from: '2026-01-01', until: null },
      { id: 'c2', kind: 'percent' as const, family: 'size' as const, percent: '50', from: '2026-01-01', until: '2026-12-31' },
      { id: 'c3', kind: 'net rate' as const, makeUp, rate: '11.37', from: '2026-01-01', until: null },
    ]),
    promotions: fc.subarray([
      { id: 'p1', name: 'All', code: null, percents: { all: '3.3' }, from: '2026-01-01', until: '2026-12-31', minimumArea: '9', tiers: [] },
      {
        id: 'p2',
        name: 'Glass',
        code: null,
        percents: { glass: '20', spacer: '7' },
        from: '2026-01-01',
        until: '2026-12-31',
        minimumArea: null,
        tiers: ['B'],
      },
    ]),
    promotionCode: fc.constant(null),
    on: fc.constant('2026-09-15'),
  });

const lineAndTerms = (content: PriceListContent) =>
  seed.chain((from) => {
    const line = lineFactory(content, 1, from, wideSpread)[0]!;
    return fc.tuple(fc.constant(line), anyTerms(makeUpKey(line.unit)));
  });
const anyCase = anyList.chain((list) => lineAndTerms(list.content).map(([line, terms]) => ({ list, line, terms })));

describe('every charge sheet', () => {
  it('sums to the unit price, and the line is unit price × quantity', () => {
    fc.assert(
      fc.property(anyCase, ({ list, line, terms }) => {
        const found = priced(line, list, terms);
        expect(found.charges.reduce((sum, { netMinor }) => sum + netMinor, 0)).toBe(found.unitPriceMinor);
        expect(BigInt(found.linePriceMinor)).toBe(BigInt(found.unitPriceMinor) * BigInt(line.quantity));
      }),
      { numRuns: 150 },
    );
  });

  it('explains each amount: quantity × rate is the list amount, and list less discount the net', () => {
    fc.assert(
      fc.property(anyCase, ({ list, line, terms }) => {
        const { currency } = list.content;
        for (const row of priced(line, list, terms).charges) {
          const product = exact(row.quantity).times(exact(row.rate));
          const isListed = row.family !== 'net rate' && row.family !== 'quantity break' && row.family !== 'promotion';
          expect(near(product, isListed ? row.listMinor : row.netMinor, currency)).toBe(true);
          if (isListed) expect(row.netMinor).toBe(percentOf(row.listMinor, new Exact(100).minus(row.discountPercent)));
          expect(row.rule).toMatch(/^(northmere\.3\/|contract\/|promotion\/)/);
          expect(row.label).not.toBe('');
        }
      }),
      { numRuns: 120 },
    );
  });

  it('has the same list amounts for every dealer', () => {
    const listMinor = (of: PricedUnit) => of.charges.reduce((sum, row) => sum + row.listMinor, 0);
    fc.assert(
      fc.property(anyCase, anyTier, ({ list, line, terms }, tier) => {
        const one = priced(line, list, terms);
        const other = priced(line, list, priceTermsFactory({ tier }));
        expect(listMinor(one)).toBe(listMinor(other));
      }),
      { numRuns: 120 },
    );
  });

  it('has no smaller area charge for a larger unit of the same make-up', () => {
    const area = (of: PricedUnit) =>
      of.charges.filter(({ family }) => (areaFamilies as readonly string[]).includes(family)).map((row) => row.listMinor);
    const more = fc.integer({ min: 0, max: 600 });
    fc.assert(
      fc.property(anyCase, more, more, ({ list, line }, wider, higher) => {
        const grow = (side: string, by: number) => exact(side).plus(by).toString();
        const { unit } = line;
        const larger = { ...line, unit: { ...unit, width: grow(unit.width, wider), height: grow(unit.height, higher) } };
        const before = area(priced(line, list));
        area(priced(larger, list)).forEach((minor, i) => expect(minor).toBeGreaterThanOrEqual(before[i]!));
      }),
      { numRuns: 120 },
    );
  });

  it('goes over the wire as decimal strings', () => {
    fc.assert(
      fc.property(anyCase, ({ list, line, terms }) => {
        const wire = lineToWire(priced(line, list, terms), []);
        expect(pricedLine.parse(wire)).toEqual(wire);
        for (const row of wire.charges) {
          expect(chargeSchema.safeParse(row).success).toBe(true);
          for (const text of [row.basis.quantity, row.rate, row.discountPercent, row.net.amount]) expect(text).toMatch(/^-?\d+(\.\d+)?$/);
        }
      }),
      { numRuns: 100 },
    );
  });

  it('at an instant never changes after a later publication', () => {
    const first = priceListFactory(northmereList, { version: 'one' });
    const second = priceListFactory(raise(northmereList, '8'), { version: 'two' });
    const versions = [{ effectiveFrom: 1000, list: first }];
    const line = { unit: unitFactory(), quantity: 6 };
    const at = (instant: number) => priced(line, versionInForce(versions, instant)!.list);
    const before = at(1500);
    versions.push({ effectiveFrom: 2000, list: second });
    expect(at(1500)).toEqual(before);
    expect(at(2000).unitPriceMinor).toBeGreaterThan(before.unitPriceMinor);
  });
});

describe('lines priced together', () => {
  it('cost what each costs alone, row by row', () => {
    fc.assert(
      fc.property(anyList, seed, fc.integer({ min: 1, max: 12 }), anyTerms('none'), (list, from, makeUps, terms) => {
        const some = lineFactory(list.content, 60, from, { ...wideSpread, makeUps });
        // Near sizes of the same unit: billed alike, but not alike in standard size, bands, quantity or extras.
        const lines = some.flatMap((line) => [line, { ...line, quantity: 5 }, nudge(line), { ...line, extras: undefined }, turned(line)]);
        expect(priceLines(lines, list, terms, catalogue)).toEqual(lines.map((line) => priceUnit(line, list, terms, catalogue)));
      }),
      { numRuns: 15 },
    );
  });

  it('keep refusals apart from prices', () => {
    const unit = unitFactory();
    const unknown = { ...unit, cavities: [{ ...unit.cavities[0]!, gas: 'krypton' }] };
    const lines = [unit, unknown, unit, unknown].map((of) => ({ unit: of, quantity: 1 }));
    const answers = priceLines(lines, priceListFactory(kestrelFordList), priceTermsFactory(), catalogue);
    expect(answers.map((answer) => ('priced' in answer ? 'priced' : answer.refusals[0]?.pointer))).toEqual([
      'priced',
      '/cavities/0/gas',
      'priced',
      '/cavities/0/gas',
    ]);
  });

  it('do not take a list for one that it was edited from, nor one catalogue for another', () => {
    const list = priceListFactory();
    const line = { unit: unitFactory(), quantity: 1 };
    const before = priced(line, list);
    const edited = { ...list, content: { ...list.content, glass: [{ glass: 'clear-3', rate: '4.20' }] } };
    expect(priced(line, edited).unitPriceMinor).toBeGreaterThan(before.unitPriceMinor);
    const renamed = priced(line, { ...list, version: 'northmere.4' });
    expect(renamed.charges[0]?.rule).toBe('northmere.4/glass/clear-3');
    const glasses = catalogue.glasses.map((glass) => (glass.id === 'clear-3' ? { ...glass, nominalMm: 4 } : glass));
    const answer = priceUnit(line, list, priceTermsFactory(), { ...catalogue, glasses });
    expect(answer).toMatchObject({
      priced: { charges: expect.arrayContaining([expect.objectContaining({ rule: 'northmere.3/treatments/tempered/4' })]) },
    });
  });
});

describe('a binary float', () => {
  const float = 2.1 as unknown as string;

  it('is no decimal: not as a rate, not as a size', () => {
    expect(() => exact(float)).toThrow(TypeError);
    const list = priceListFactory({ glass: [{ glass: 'clear-3', rate: float }] });
    expect(() => priced({ unit: unitFactory(), quantity: 1 }, list)).toThrow('not a decimal string: 2.1');
    const unit = { ...unitFactory(), width: 927.1 as unknown as string };
    expect(() => priced({ unit, quantity: 1, weightKg: '18' })).toThrow(TypeError);
    expect(() => priced({ unit: unitFactory(), quantity: 1, weightKg: 999.5 as unknown as string })).toThrow(TypeError);
  });

  it('is refused by the contracts of lists and sheets', () => {
    expect(priceListContent.safeParse({ ...northmereList, glass: [{ glass: 'clear-3', rate: 2.1 }] }).success).toBe(false);
    expect(priceListContent.safeParse({ ...northmereList, billing: { increment: 2, minimumArea: '3' } }).success).toBe(false);
    const row = lineToWire(priced({ unit: unitFactory(), quantity: 1 }), []).charges[0]!;
    expect(chargeSchema.safeParse(row).success).toBe(true);
    expect(chargeSchema.safeParse({ ...row, rate: 2.1 }).success).toBe(false);
    expect(chargeSchema.safeParse({ ...row, net: { amount: 24.38, currency: 'USD' } }).success).toBe(false);
  });

  it('never stands where whole minor units must', () => {
    fc.assert(
      fc.property(anyCase, ({ list, line, terms }) => {
        const found = priced(line, list, terms);
        for (const { listMinor, netMinor } of found.charges) expect([listMinor, netMinor].every(Number.isSafeInteger)).toBe(true);
      }),
      { numRuns: 50 },
    );
    expect(() => wholeMinor(new Exact('9007199254740993'))).toThrow(RangeError);
  });
});

describe('rounding', () => {
  it('is that of the money of the whole product', () => {
    const minor = fc.integer({ min: -1_000_000_000, max: 1_000_000_000 });
    const hundredths = fc.integer({ min: 0, max: 10_000 });
    fc.assert(
      fc.property(minor, hundredths, (amount, of) => {
        const percent = new Exact(of).dividedBy(100);
        expect(partOf(amount, percent.dividedBy(100))).toBe(percentOf(amount, percent));
        expect(wholeMinor(new Exact(amount).dividedBy(8))).toBe(roundToMinor(new Exact(amount).dividedBy(800), 'USD'));
      }),
    );
  });
});

/** Whether `minor` is the rounded product, give or take what was cut off its quotients. */
function near(product: Exact, minor: number, currency: Currency): boolean {
  const sliver = new Exact('1e-12');
  return [product.minus(sliver), product, product.plus(sliver)].some((candidate) => roundToMinor(candidate, currency) === minor);
}

function nudge(line: LineToPrice): LineToPrice {
  const { unit } = line;
  return {
    ...line,
    unit: { ...unit, width: exact(unit.width).minus('0.7').toString(), height: exact(unit.height).minus('0.3').toString() },
  };
}

function turned(line: LineToPrice): LineToPrice {
  return { ...line, unit: { ...line.unit, width: line.unit.height, height: line.unit.width } };
}
