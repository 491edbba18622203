import { type SimpleCellAddress } from 'hyperformula';
import { type PriceListContent, type PriceTerms } from '@shared/contracts/price-lists';
import { makeUpKey } from '@shared/glazing/make-up-key';
import { type Charge } from '@api/pricing/engine/charge';
import { weighUnit } from '@api/pricing/engine/measure-line';
import { priceLines } from '@api/pricing/engine/price-lines';
import { type LineToPrice, type PricedUnit } from '@api/pricing/engine/price-unit';
import { aldersundList, kestrelFordList, northmereList } from '@seeds/demo/price-lists';
import { catalogueFactory } from '../../factories/catalogue-factory';
import { lineFactory, wideSpread } from '../../factories/line-factory';
import { priceListFactory, priceTermsFactory } from '../../factories/price-list-factory';
import { priceWorkbook, type PriceWorkbook, type Slot, type WorkbookLine } from './price-workbook';
import { cents, over, type Ratio, ratio, times } from './ratio';

/**
 * Charge sheets of the engine against a spreadsheet of the same list (HyperFormula 3.5.0), row by
 * row: amounts before rounding within 1e-9, rounded amounts to the cent. A spreadsheet's floats miss
 * some half cents; where the exact amount is one, whole numbers decide (`ratio.ts`) and the cell is
 * set right, so that what follows from it is compared too.
 */

const catalogue = catalogueFactory();
const tally = { units: 0, rows: 0, amounts: 0, ties: 0, missedBySpreadsheet: 0 };

const agreed = (makeUp: string): PriceTerms =>
  priceTermsFactory({
    tier: 'C',
    contracts: [
      { id: 'c1', kind: 'percent', family: 'spacer', percent: '7.5', from: '2026-01-01', until: null },
      { id: 'c2', kind: 'percent', family: 'glass', percent: '0', from: '2026-01-01', until: null },
      { id: 'c3', kind: 'net rate', makeUp, rate: '13.37', from: '2026-01-01', until: null },
    ],
    promotions: [
      {
        id: 'p1',
        name: 'large',
        code: null,
        percents: { all: '4.5' },
        from: '2026-01-01',
        until: '2026-12-31',
        minimumArea: '2.5',
        tiers: [],
      },
      {
        id: 'p2',
        name: 'all',
        code: null,
        percents: { all: '1.25' },
        from: '2026-01-01',
        until: '2026-12-31',
        minimumArea: null,
        tiers: [],
      },
    ],
  });

function linesFor(content: PriceListContent, seed: number): LineToPrice[] {
  return lineFactory(content, 100, seed, { ...wideSpread, makeUps: 60 }).map((line) => {
    const weighed = weighUnit(line.unit, catalogue);
    if ('refusals' in weighed) throw new Error(JSON.stringify(weighed));
    return { ...line, weightKg: weighed.weightKg };
  });
}

describe.each([
  ['imperial, standard sizes', northmereList, 11],
  ['imperial, fixed charges', kestrelFordList, 23],
  ['metric', aldersundList, 37],
])('a spreadsheet of the list: %s', (_, content, seed) => {
  const lines = linesFor(content, seed);
  it.each([
    ['tier B', priceTermsFactory()],
    ['contracts, a net rate and promotions', agreed(makeUpKey(lines[0]!.unit))],
  ])('comes to the same charges, row by row: %s', (__, terms) => {
    const workbook = priceWorkbook(content, terms, lines, true);
    const answers = priceLines(lines, priceListFactory(content), terms, catalogue);
    answers.forEach((answer, i) => {
      if ('refusals' in answer) throw new Error(JSON.stringify(answer.refusals));
      compare(answer.priced, workbook, workbook.lines[i]!);
    });
    workbook.book.destroy();
  });
});

it('holds over at least 500 units, with half cents among them', () => {
  expect(tally.units).toBeGreaterThanOrEqual(500);
  expect(tally.ties).toBeGreaterThan(50);
  console.log(
    `${tally.units} units, ${tally.rows} rows, ${tally.amounts} rounded amounts; ${tally.ties} half cents, ` +
      `${tally.missedBySpreadsheet} of which the spreadsheet rounds the other way, and nothing else differs`,
  );
});

function compare(priced: PricedUnit, { book }: PriceWorkbook, line: WorkbookLine): void {
  const read = (address: SimpleCellAddress): number => {
    const value = book.getCellValue(address);
    if (typeof value !== 'number') throw new Error(`${JSON.stringify(address)}: ${JSON.stringify(value)}`);
    return value;
  };
  /** The cell in cents, once a half cent is set right; compared with ours. */
  const settle = (address: SimpleCellAddress, exact: Ratio, ours: number, of: string) => {
    tally.amounts += 1;
    const { tie, cents: right } = cents(exact);
    if (tie) {
      tally.ties += 1;
      if (inCents(read(address)) !== right) {
        tally.missedBySpreadsheet += 1;
        book.setCellContents(address, right / 100);
      }
    }
    expect([of, inCents(read(address))]).toEqual([of, ours]);
  };

  const netRated = read(line.slots[0]!.net) > 0;
  const charged = line.slots.filter((slot) => {
    if (slot.family === 'net rate') return netRated;
    return slot.unrounded !== null && read(slot.unrounded) !== 0;
  });
  const isArea = ({ family }: Slot) => ['glass', 'treatment', 'coating', 'assembly', 'gas'].includes(family);

  // What a net rate replaces is on no sheet of ours; its list amounts show in the sum that the net rate carries.
  const shown = charged.filter((slot) => !(netRated && isArea(slot)));
  expect(priced.charges.map(({ family }) => family)).toEqual(shown.map(({ family }) => family));
  for (const slot of charged.filter((hidden) => netRated && isArea(hidden))) {
    const { tie, cents: right } = cents(slot.exact!);
    if (tie) book.setCellContents(slot.rounded, right / 100);
  }

  shown.forEach((slot, i) => compareSlot(slot, priced.charges[i]!));
  tally.units += 1;
  tally.rows += shown.length;
  expect(inCents(read(line.unitPrice))).toBe(priced.unitPriceMinor);
  expect(inCents(read(line.linePrice))).toBe(priced.linePriceMinor);

  function compareSlot(slot: Slot, row: Charge): void {
    const product = Number(row.quantity) * Number(row.rate);
    if (slot.unrounded) expect(Math.abs(read(slot.unrounded) - product)).toBeLessThan(1e-9 * Math.max(1, Math.abs(product)));

    if (slot.family === 'net rate') {
      expect(inCents(read(slot.rounded))).toBe(row.listMinor);
      return settle(slot.net, times(slot.exact!, ratio(String(read(slot.percentOf!.percent)))), row.netMinor, row.rule);
    }
    if (slot.percentOf) {
      const { base, percent, sign } = slot.percentOf;
      const exact = over(times(ratio(String(sign * inCents(read(base)))), ratio(String(read(percent)))), 10_000n);
      if (slot.discount === null) return settle(slot.net, exact, row.netMinor, row.rule);
      settle(slot.rounded, exact, row.listMinor, row.rule);
    } else if (slot.exact) {
      settle(slot.rounded, slot.exact, row.listMinor, row.rule);
    } else {
      expect(inCents(read(slot.rounded))).toBe(row.listMinor);
    }
    const kept = ratio(String(100 - read(slot.discount!)));
    const netExact = over(times(ratio(String(inCents(read(slot.rounded)))), kept), 10_000n);
    if (slot.netUnrounded)
      expect(Math.abs(read(slot.netUnrounded) - (row.listMinor * (100 - Number(row.discountPercent))) / 10_000)).toBeLessThan(1e-9);
    settle(slot.net, netExact, row.netMinor, row.rule);
  }
}

function inCents(value: number): number {
  const whole = Math.round(value * 100);
  if (Math.abs(value * 100 - whole) > 1e-6) throw new Error(`${value} is not in whole cents`);
  return whole === 0 ? 0 : whole;
}
