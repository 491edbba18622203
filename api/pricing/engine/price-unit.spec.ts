import { aldersundList, kestrelFordList, northmereList } from '@seeds/demo/price-lists';
import { catalogueFactory, tripleFactory, unitFactory as unit } from '../../../test/factories/catalogue-factory';
import { priceListFactory, pricedUnitFactory as priced, priceTermsFactory, rowOf } from '../../../test/factories/price-list-factory';
import { type LineToPrice, type PricedUnit, priceUnit } from './price-unit';

const catalogue = catalogueFactory();

function refused(line: LineToPrice, list = priceListFactory()) {
  const answer = priceUnit(line, list, priceTermsFactory(), catalogue);
  if ('priced' in answer) throw new Error('was priced');
  return answer.refusals;
}

const amounts = (of: PricedUnit) => of.charges.map(({ label, listMinor, netMinor }) => [label, listMinor, netMinor]);

/** Worked by hand; prices in cents. */
describe('the worked example', () => {
  const six = (width: string, height: string): LineToPrice => ({ unit: unit({ width, height }), quantity: 6 });

  it('prices 36 1/2 × 48 1/4 in row by row', () => {
    const found = priced(six('927.1', '1225.55'));
    expect(amounts(found)).toEqual([
      ['glass, lite 1', 2771, 2438],
      ['glass, lite 2', 2771, 2438],
      ['tempering, lite 1', 2573, 2264],
      ['tempering, lite 2', 2573, 2264],
      ['soft low-e, surface 3', 1781, 1567],
      ['assembly', 4486, 3948],
      ['stainless steel spacer', 909, 909],
      ['argon', 726, 690],
      ['non-standard size, 6 %', 1061, 1061],
      ['over 80 united inches, 8 %', 1414, 1414],
      ['5 or more, 3 %', 0, -570],
    ]);
    expect(found.unitPriceMinor).toBe(18423);
    expect(found.linePriceMinor).toBe(110_538);
  });

  it.each([
    ['36 × 48 in, a standard size', '914.4', '1219.2', 15860],
    ['40 × 62 in, 102 united inches', '1016', '1574.8', 25488],
    ['11 × 13 1/2 in, billed at the minimum', '279.4', '342.9', 3971],
  ])('prices %s', (_, width, height, unitPriceMinor) => {
    expect(priced(six(width, height)).unitPriceMinor).toBe(unitPriceMinor);
  });

  it('says of each row what it counts, at which rate and under which rule', () => {
    const found = priced(six('927.1', '1225.55'));
    expect(rowOf(found, 'glass, lite 2')).toEqual({
      family: 'glass',
      label: 'glass, lite 2',
      quantity: '13.19444444444444444444',
      unit: 'ft²',
      rate: '2.10',
      listMinor: 2771,
      discountPercent: '12',
      discountReason: 'tier B',
      netMinor: 2438,
      rule: 'northmere.3/glass/clear-3',
    });
    expect(rowOf(found, 'stainless steel spacer')).toMatchObject({
      quantity: '14.66666666666666666667',
      unit: 'ft',
      rate: '0.62',
    });
    expect(rowOf(found, 'non-standard size, 6 %')).toMatchObject({ quantity: '176.81', unit: 'USD', rate: '0.06' });
    expect(rowOf(found, '5 or more, 3 %')).toMatchObject({
      family: 'quantity break',
      quantity: '189.93',
      unit: 'USD',
      rate: '-0.03',
      rule: 'northmere.3/quantityBreaks/5',
    });
    expect(rowOf(priced(six('279.4', '342.9')), 'argon, minimum')).toMatchObject({
      quantity: '1',
      unit: 'cavity',
      rate: '2.00',
      listMinor: 200,
      netMinor: 190,
    });
  });
});

describe('the billed size', () => {
  it('is rounded up, never down, and not when it fits', () => {
    const area = (width: string, height: string) => rowOf(priced({ unit: unit({ width, height }), quantity: 1 }), 'assembly').quantity;
    expect(area('914.4', '1219.2')).toBe('12');
    expect(area('914.40000001', '1219.2')).toBe('12.66666666666666666667');
    expect(area('914.39999999', '1219.2')).toBe('12');
  });

  it('rounds a half cent up, whatever the quotient of the area', () => {
    // 36 × 46 in at the rate 0.01: 11.5 ft² make 0.115. 20 × 68 in: 9.4444… ft² at 0.009 make 0.085 exactly.
    const at = (rate: string, width: string, height: string) => {
      const list = priceListFactory({ assembly: [{ cavity: 1, rate }] });
      return rowOf(priced({ unit: unit({ width, height }), quantity: 1 }, list), 'assembly').listMinor;
    };
    expect(at('0.01', '914.4', '1168.4')).toBe(12);
    expect(at('0.009', '508', '1727.2')).toBe(9);
    // 4 × 6 in billed below no minimum: 1.3333… ft² at 6.75375 is 9.005 exactly; the quotient cut first would give 9.00.
    const list = priceListFactory({ billing: { increment: '2', minimumArea: '0' }, assembly: [{ cavity: 1, rate: '6.75375' }] });
    expect(rowOf(priced({ unit: unit({ width: '304.8', height: '406.4' }), quantity: 1 }, list), 'assembly').listMinor).toBe(901);
  });

  it('is that of the bounding rectangle for a shape, whose charge is a percentage and a fixed amount', () => {
    const found = priced({ unit: unit({ shape: { class: 'half-round' } }), quantity: 1 });
    expect(rowOf(found, 'assembly').listMinor).toBe(4486);
    expect(rowOf(found, 'half round, 45 %')).toMatchObject({ family: 'shape', listMinor: 7956, rule: 'northmere.3/shapes/half-round' });
    expect(rowOf(found, 'half round')).toMatchObject({ listMinor: 3500, quantity: '1', unit: 'unit', rate: '35.00' });
  });
});

describe('size charges', () => {
  const labels = (width: string, height: string, list = priceListFactory()) =>
    priced({ unit: unit({ width, height }), quantity: 1 }, list)
      .charges.filter(({ family }) => family === 'size')
      .map(({ label }) => label);

  it('take a standard size as listed, not turned', () => {
    expect(labels('914.4', '1219.2')).toEqual(['over 80 united inches, 8 %']);
    expect(labels('1219.2', '914.4')).toEqual(['non-standard size, 6 %', 'over 80 united inches, 8 %']);
    expect(labels('0914.400', '1219.20')).toEqual(['over 80 united inches, 8 %']);
  });

  it('begin above a threshold, not at it', () => {
    expect(labels('914.4', '1117.6')).toEqual(['non-standard size, 6 %']);
    expect(labels('914.4', '1117.60000001')).toEqual(['non-standard size, 6 %', 'over 80 united inches, 8 %']);
  });

  it('take the highest band of each kind, and add the kinds up', () => {
    const list = priceListFactory(kestrelFordList, { version: 'kestrel-ford.2' });
    expect(labels('1219.2', '2794', list)).toEqual(['long edge over 108 in', 'over 25 ft²']);
    const glass = { glass: 'clear-6', treatment: 'tempered' };
    const heavy = priced({ unit: unit({ width: '1828.8', height: '2438.4', lites: [glass, glass] }), quantity: 1 });
    expect(rowOf(heavy, 'over 130 united inches, 24 %').rule).toBe('northmere.3/sizeCharges/bands/united/130');
    expect(rowOf(heavy, 'over 250 lb')).toMatchObject({ listMinor: 8000, netMinor: 8000 });
  });

  it('can be fixed and a percentage at once, in the list’s own measure', () => {
    const list = priceListFactory(aldersundList, { version: 'aldersund.2' });
    const found = priced({ unit: tripleFactory({ width: '1600', height: '2600' }), quantity: 1 }, list);
    expect(found.currency).toBe('EUR');
    expect(rowOf(found, 'non-standard size').listMinor).toBe(240);
    expect(rowOf(found, 'over 4 m², 14 %').rate).toBe('0.14');
    expect(rowOf(found, 'over 4 m²').listMinor).toBe(2500);
    expect(rowOf(found, 'long edge over 2400 mm').listMinor).toBe(2800);
    expect(rowOf(found, 'over 90 kg').listMinor).toBe(3200);
    expect(rowOf(found, 'assembly, cavity 2')).toMatchObject({ quantity: '4.16', unit: 'm²', rate: '27.00', listMinor: 11232 });
  });
});

describe('charges by length and piece', () => {
  it('count bars at billed lengths, and crossings', () => {
    const found = priced({ unit: unit({ grid: { bar: 'flat-16', across: 2, down: 3 } }), quantity: 1 });
    // 2 × 50 in and 3 × 38 in are 214 in.
    expect(rowOf(found, 'grid, flat bar 16 mm')).toMatchObject({
      quantity: '17.83333333333333333333',
      unit: 'ft',
      listMinor: 1694,
    });
    expect(rowOf(found, 'grid, crossings')).toMatchObject({ quantity: '6', unit: 'crossing', listMinor: 450 });
  });

  it('leave out a grid of no bars, edges as cut, glass left annealed and rates of nothing', () => {
    const lites = unit().lites.map(({ glass }) => ({ glass, treatment: 'annealed' }));
    const cavities = [{ width: '16', gas: 'air', spacer: 'stainless' }];
    const found = priced({ unit: unit({ lites, cavities, grid: { bar: 'flat-16', across: 0, down: 0 } }), quantity: 1 });
    expect(new Set(found.charges.map(({ family }) => family))).toEqual(new Set(['glass', 'assembly', 'spacer', 'size']));
  });

  it('work the edges of the lites that ask for it', () => {
    const [outer, inner] = unit().lites;
    const found = priced({ unit: unit({ lites: [outer!, { ...inner!, edgeWork: 'ground' }] }), quantity: 1 });
    expect(rowOf(found, 'ground edges, lite 2')).toMatchObject({ unit: 'ft', listMinor: 704 });
  });

  it('charge tubes, what is on everything, and what is asked for', () => {
    const open = { width: '16', gas: 'air', spacer: 'stainless', capillary: true };
    expect(rowOf(priced({ unit: unit({ cavities: [open] }), quantity: 1 }), 'Capillary tube')).toMatchObject({
      quantity: '1',
      unit: 'tube',
      listMinor: 325,
    });
    expect(rowOf(priced({ unit: unit(), quantity: 1, extras: ['setting-blocks'] }), 'Setting blocks').listMinor).toBe(90);
    const list = priceListFactory(kestrelFordList);
    const found = priced({ unit: unit(), quantity: 7, extras: ['survey'] }, list);
    expect(rowOf(found, 'Label and cork pads').listMinor).toBe(35);
    // 85.00 for the line is 12.142857… for each of seven.
    expect(rowOf(found, 'Site survey')).toMatchObject({ unit: 'line', rate: '85.00', listMinor: 1214 });
    expect(found.linePriceMinor).toBe(found.unitPriceMinor * 7);
  });
});

describe('a list', () => {
  const pointers = (line: LineToPrice, content = northmereList) => refused(line, priceListFactory(content)).map(({ pointer }) => pointer);

  it('refuses each product that it has no rate for, with a pointer', () => {
    const lites = [
      { glass: 'obscured-4', treatment: 'heat-strengthened', coating: { id: 'low-e-hard', surface: 2 } },
      { glass: 'clear-3', treatment: 'annealed', edgeWork: 'polished' },
      { glass: 'clear-3', treatment: 'annealed' },
    ];
    const cavity = { width: '12', gas: 'krypton', spacer: 'stainless' };
    const line: LineToPrice = {
      unit: unit({ lites, cavities: [cavity, cavity], grid: { bar: 'profiled-19', across: 1, down: 1 }, shape: { class: 'circle' } }),
      quantity: 1,
      extras: ['label', 'flowers'],
    };
    expect(pointers(line, { ...kestrelFordList, assembly: kestrelFordList.assembly.slice(0, 1) })).toEqual([
      '/lites/0/glass',
      '/lites/0/treatment',
      '/lites/0/coating/id',
      '/cavities/1',
      '/cavities/0/gas',
      '/cavities/1/gas',
      '/grid/bar',
      '/extras/0',
      '/extras/1',
      '/shape/class',
    ]);
  });

  it('says what it refuses', () => {
    const [reason] = refused({ unit: tripleFactory(), quantity: 1, extras: ['flowers'] });
    expect(reason).toEqual({
      code: 'no-rate',
      detail: 'Northmere trade list 3 has no rate for the extra “flowers”',
      limit: 'products with a rate in the list',
      actual: 'the extra “flowers”',
      nearest: null,
      nearestValue: null,
      pointer: '/extras/0',
    });
  });

  it('refuses a tube it has no rate for, an unheard-of spacer and edges', () => {
    const lites = unit().lites.map((lite) => ({ ...lite, edgeWork: 'polished' }));
    const open = { width: '16', gas: 'air', spacer: 'rubber', capillary: true };
    expect(pointers({ unit: unit({ lites, cavities: [open] }), quantity: 1, weightKg: '20' }, { ...northmereList, extras: [] })).toEqual([
      '/cavities/0/spacer',
      '/lites/0/edgeWork',
      '/lites/1/edgeWork',
      '/cavities/0/capillary',
    ]);
  });

  it('refuses a product without weight where weight decides', () => {
    const lites = [{ glass: 'unheard-of', treatment: 'annealed' }, unit().lites[1]!];
    expect(refused({ unit: unit({ lites }), quantity: 1 })).toMatchObject([{ code: 'unknown-product', pointer: '/lites/0/glass' }]);
  });
});
