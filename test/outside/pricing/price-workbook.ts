import { HyperFormula, type RawCellContent, type SimpleCellAddress } from 'hyperformula';
import { type PriceListContent, type PriceTerms, type UnitFamily, unitFamilies } from '@shared/contracts/price-lists';
import { type Unit } from '@shared/contracts/units';
import { makeUpKey } from '@shared/glazing/make-up-key';
import { catalogueData } from '../../../seeds/reference/catalogue-data';
import { larger, over, plus, type Ratio, ratio, times, toNumber, upTo } from './ratio';

/**
 * A price list as the spreadsheet a sales desk would keep: rates on sheets of their own, one row a
 * line, every charge a cell formula. Written from the rules of pricing alone; it knows nothing of
 * the pricing engine. Calculated by HyperFormula 3.5.0.
 */
export interface PriceWorkbook {
  book: HyperFormula;
  lines: WorkbookLine[];
  /** address of the rate of a part's entry, for changing it */
  rateOf(part: RatePart, row: number): SimpleCellAddress;
}

export interface WorkbookLine {
  slots: Slot[];
  unitPrice: SimpleCellAddress;
  linePrice: SimpleCellAddress;
}

/** One possible row of the charge sheet; charged when its unrounded amount is not nothing. */
export interface Slot {
  family: UnitFamily | 'net rate' | 'quantity break' | 'promotion';
  /** null where the desk rounds at once */
  unrounded: SimpleCellAddress | null;
  rounded: SimpleCellAddress;
  netUnrounded: SimpleCellAddress | null;
  net: SimpleCellAddress;
  /** the exact amount before rounding, where it follows from the list and the size alone; of a net rate the exact area */
  exact: Ratio | null;
  /** otherwise the cell it is a percentage of, and the cell of the percentage */
  percentOf: { base: SimpleCellAddress; percent: SimpleCellAddress; sign: 1 | -1 } | null;
  /** cell of the discount in percent; null where none is taken */
  discount: SimpleCellAddress | null;
}

export interface WorkbookInput {
  unit: Unit;
  quantity: number;
  extras?: readonly string[] | undefined;
  weightKg?: string | undefined;
}

export type RatePart = 'Glass' | 'Treatments' | 'Coatings' | 'Assembly' | 'Spacers' | 'Gases' | 'Grids' | 'Edges' | 'Shapes' | 'Extras';
const nominal = new Map(catalogueData.glasses.map(({ id, nominalMm }) => [id, nominalMm]));

/** `stepwise` gives the unrounded amounts cells of their own, so that they can be looked at. */
export function priceWorkbook(
  content: PriceListContent,
  terms: PriceTerms,
  inputs: readonly WorkbookInput[],
  stepwise: boolean,
): PriceWorkbook {
  const sheets: Record<string, RawCellContent[][]> = { ...ratesOf(content), ...termsOf(content, terms) };
  const drafts = inputs.map((input, row) => draftLine(content, input, row, stepwise));
  const book = HyperFormula.buildFromSheets({ ...sheets, Lines: drafts.map(({ cells }) => cells) }, { licenseKey: 'gpl-v3' });
  const id = (name: string) => {
    const sheet = book.getSheetId(name);
    if (sheet === undefined) throw new Error(`no sheet ${name}`);
    return sheet;
  };
  const lines = id('Lines');
  const discounts = id('Discounts');
  const at = (row: number, col: number): SimpleCellAddress => ({ sheet: lines, row, col });
  return {
    book,
    rateOf: (part, row) => ({ sheet: id(part), row, col: 1 }),
    lines: drafts.map(({ slots, unitPrice, linePrice }, row) => ({
      unitPrice: at(row, unitPrice),
      linePrice: at(row, linePrice),
      slots: slots.map((slot) => ({
        family: slot.family,
        unrounded: slot.unrounded === null ? null : at(row, slot.unrounded),
        rounded: at(row, slot.rounded),
        netUnrounded: slot.netUnrounded === null ? null : at(row, slot.netUnrounded),
        net: at(row, slot.net),
        exact: slot.exact,
        percentOf: slot.percentOf && {
          base: at(row, slot.percentOf.base),
          percent: at(row, slot.percentOf.percent),
          sign: slot.percentOf.sign,
        },
        discount: slot.discounted ? { sheet: discounts, row: unitFamilies.indexOf(slot.family as UnitFamily), col: 3 } : null,
      })),
    })),
  };
}

/** The list's own sheets: an entry a row, its rates as numbers. */
function ratesOf(content: PriceListContent): Record<RatePart | 'Standard' | 'Bands' | 'Breaks' | 'Settings', RawCellContent[][]> {
  const { nonStandard, bands } = content.sizeCharges;
  const filled = (rows: RawCellContent[][]) => (rows.length > 0 ? rows : [['none', 0, 0, 0]]);
  return {
    Glass: content.glass.map(({ glass, rate }) => [glass, Number(rate)]),
    Treatments: content.treatments.map(({ treatment, nominalMm, rate }) => [`${treatment}|${nominalMm}`, Number(rate)]),
    Coatings: content.coatings.map(({ coating, rate }) => [coating, Number(rate)]),
    Assembly: content.assembly.map(({ cavity, rate }) => [cavity, Number(rate)]),
    Spacers: content.spacers.map(({ spacer, rate }) => [spacer, Number(rate)]),
    Gases: content.gases.map(({ gas, rate, minimum }) => [gas, Number(rate), Number(minimum)]),
    Grids: filled(content.grids.map(({ bar, rate, perCrossing }) => [bar, Number(rate), Number(perCrossing)])),
    Edges: filled(content.edgeWork.map(({ edgeWork, rate }) => [edgeWork, Number(rate)])),
    Shapes: filled(content.shapes.map(({ shape, percent, fixed }) => [shape, Number(percent), Number(fixed)])),
    Extras: filled(content.extras.map(({ id, rate }) => [id, Number(rate)])),
    Standard: filled(content.standardSizes.map(({ width, height }) => [Number(width), Number(height)])),
    Bands: filled(bands.map(({ kind, above, percent, fixed }) => [kind, Number(above), Number(percent), Number(fixed)])),
    Breaks: filled(content.quantityBreaks.map(({ atLeast, percent }) => [atLeast, Number(percent)])),
    Settings: [
      [Number(content.billing.increment)],
      [Number(content.billing.minimumArea)],
      [Number(nonStandard?.percent ?? 0)],
      [Number(nonStandard?.fixed ?? 0)],
    ],
  };
}

/** What the dealer's terms come to: discount by family, net rates by make-up, promotions on everything. */
function termsOf(content: PriceListContent, terms: PriceTerms): Record<'Discounts' | 'NetRates' | 'Promotions', RawCellContent[][]> {
  const tier = content.tiers.find((entry) => entry.tier === terms.tier);
  const agreed = (family: UnitFamily) => terms.contracts.find((entry) => entry.kind === 'percent' && entry.family === family);
  const netRates = terms.contracts.flatMap((entry) => (entry.kind === 'net rate' ? [[entry.makeUp, Number(entry.rate)]] : []));
  const promotions = terms.promotions.flatMap(({ percents, minimumArea }) =>
    'all' in percents ? [[Number(percents.all), Number(minimumArea ?? 0)]] : [],
  );
  return {
    Discounts: unitFamilies.map((family, i) => {
      const contract = agreed(family);
      return [
        family,
        Number(tier?.percents[family] ?? 0),
        contract?.kind === 'percent' ? Number(contract.percent) : null,
        `=IF(ISBLANK(C${i + 1}),B${i + 1},C${i + 1})`,
      ];
    }),
    NetRates: netRates.length > 0 ? netRates : [['none', 0]],
    Promotions: promotions.length > 0 ? promotions : [[0, 0]],
  };
}

interface DraftSlot {
  family: Slot['family'];
  unrounded: number | null;
  rounded: number;
  netUnrounded: number | null;
  net: number;
  exact: Ratio | null;
  percentOf: { base: number; percent: number; sign: 1 | -1 } | null;
  discounted: boolean;
}

interface Draft {
  cells: RawCellContent[];
  slots: DraftSlot[];
  unitPrice: number;
  linePrice: number;
}

/** The cells of one line from left to right; formulas only for what the unit has. */
function draftLine(
  content: PriceListContent,
  { unit, quantity, extras = [], weightKg = '0' }: WorkbookInput,
  row: number,
  stepwise: boolean,
): Draft {
  const cells: RawCellContent[] = [];
  const slots: DraftSlot[] = [];
  const put = (cell: RawCellContent) => cells.push(cell) - 1;
  const ref = (col: number) => `${columnName(col)}${row + 1}`;
  const sheetRows = (name: RatePart | 'Standard' | 'Bands' | 'Breaks' | 'NetRates' | 'Promotions', last: string) => {
    const counts: Record<typeof name, number> = {
      Glass: content.glass.length,
      Treatments: content.treatments.length,
      Coatings: content.coatings.length,
      Assembly: content.assembly.length,
      Spacers: content.spacers.length,
      Gases: content.gases.length,
      Grids: content.grids.length,
      Edges: content.edgeWork.length,
      Shapes: content.shapes.length,
      Extras: content.extras.length,
      Standard: content.standardSizes.length,
      Bands: content.sizeCharges.bands.length,
      Breaks: content.quantityBreaks.length,
      NetRates: 9,
      Promotions: 9,
    };
    return `${name}!$A$1:$${last}$${Math.max(counts[name], 1)}`;
  };
  const column = (name: Parameters<typeof sheetRows>[0], letter: string) =>
    sheetRows(name, 'A').replace('$A$1:$A', `$${letter}$1:$${letter}`);
  const look = (key: string, part: RatePart, index = 2) => `VLOOKUP(${key},${sheetRows(part, 'C')},${index},FALSE())`;
  const discountRef = (family: UnitFamily) => `Discounts!$D$${unitFamilies.indexOf(family) + 1}`;

  const imperial = content.measure === 'imperial';
  const [areaParts, lengthParts] = imperial ? [144n, 12n] : [1_000_000n, 1000n];
  const inList = (mm: string): Ratio => (imperial ? times(ratio(mm), { top: 10n, bottom: 254n }) : ratio(mm));
  const width = inList(unit.width);
  const height = inList(unit.height);
  const step = ratio(content.billing.increment);
  const billed = { width: upTo(width, step), height: upTo(height, step) };
  const area = larger(over(times(billed.width, billed.height), areaParts), ratio(content.billing.minimumArea));
  const perimeter = over(times(plus(billed.width, billed.height), ratio('2')), lengthParts);

  const w = put(toNumber(width));
  const h = put(toNumber(height));
  const q = put(quantity);
  const bw = put(`=CEILING(${ref(w)},Settings!$A$1)`);
  const bh = put(`=CEILING(${ref(h)},Settings!$A$1)`);
  const a = put(`=MAX(${ref(bw)}*${ref(bh)}/${areaParts},Settings!$A$2)`);
  const p = put(`=2*(${ref(bw)}+${ref(bh)})/${lengthParts}`);

  const charge = (family: UnitFamily, formula: string, exact: Ratio | null, percentOf: DraftSlot['percentOf'] = null): DraftSlot => {
    const unrounded = stepwise ? put(`=${formula}`) : null;
    const rounded = put(`=ROUND(${unrounded === null ? formula : ref(unrounded)},2)`);
    const netFormula = `${ref(rounded)}*(1-${discountRef(family)}/100)`;
    const netUnrounded = stepwise ? put(`=${netFormula}`) : null;
    const net = put(`=ROUND(${netUnrounded === null ? netFormula : ref(netUnrounded)},2)`);
    const slot: DraftSlot = { family, unrounded, rounded, netUnrounded, net, exact, percentOf, discounted: true };
    slots.push(slot);
    return slot;
  };
  const rateOf = <Row extends { rate: string }>(rows: readonly Row[], is: (row: Row) => boolean) => ratio(rows.find(is)?.rate ?? '0');

  for (const { glass } of unit.lites) {
    charge(
      'glass',
      `${ref(a)}*${look(ref(put(glass)), 'Glass')}`,
      times(
        area,
        rateOf(content.glass, (entry) => entry.glass === glass),
      ),
    );
  }
  for (const { glass, treatment } of unit.lites) {
    if (treatment === 'annealed') continue;
    const mm = nominal.get(glass);
    const rate = rateOf(content.treatments, (entry) => entry.treatment === treatment && entry.nominalMm === mm);
    charge('treatment', `${ref(a)}*${look(ref(put(`${treatment}|${mm}`)), 'Treatments')}`, times(area, rate));
  }
  for (const { coating } of unit.lites) {
    if (!coating) continue;
    const rate = rateOf(content.coatings, (entry) => entry.coating === coating.id);
    charge('coating', `${ref(a)}*${look(ref(put(coating.id)), 'Coatings')}`, times(area, rate));
  }
  unit.cavities.forEach((_, i) => {
    const rate = rateOf(content.assembly, (entry) => entry.cavity === i + 1);
    charge('assembly', `${ref(a)}*${look(String(i + 1), 'Assembly')}`, times(area, rate));
  });
  for (const { spacer } of unit.cavities) {
    const rate = rateOf(content.spacers, (entry) => entry.spacer === spacer);
    charge('spacer', `${ref(p)}*${look(ref(put(spacer)), 'Spacers')}`, times(perimeter, rate));
  }
  for (const { gas } of unit.cavities) {
    const entry = content.gases.find((candidate) => candidate.gas === gas);
    const name = ref(put(gas));
    const least = ratio(entry?.minimum ?? '0');
    charge('gas', `MAX(${ref(a)}*${look(name, 'Gases')},${look(name, 'Gases', 3)})`, larger(times(area, ratio(entry?.rate ?? '0')), least));
  }
  if (unit.grid && unit.grid.across + unit.grid.down > 0) {
    const { bar, across, down } = unit.grid;
    const entry = content.grids.find((candidate) => candidate.bar === bar);
    const name = ref(put(bar));
    const bars = over(plus(times(billed.height, ratio(String(across))), times(billed.width, ratio(String(down)))), lengthParts);
    charge(
      'grid',
      `(${across}*${ref(bh)}+${down}*${ref(bw)})/${lengthParts}*${look(name, 'Grids')}`,
      times(bars, ratio(entry?.rate ?? '0')),
    );
    const crossings = ratio(String(across * down));
    charge('grid', `${across * down}*${look(name, 'Grids', 3)}`, times(crossings, ratio(entry?.perCrossing ?? '0')));
  }
  for (const { edgeWork } of unit.lites) {
    if (edgeWork === undefined) continue;
    const rate = rateOf(content.edgeWork, (entry) => entry.edgeWork === edgeWork);
    charge('edge work', `${ref(p)}*${look(ref(put(edgeWork)), 'Edges')}`, times(perimeter, rate));
  }
  const tubes = unit.cavities.filter(({ capillary }) => capillary).length;
  for (const { id, applies, per, rate } of content.extras) {
    if (applies === 'capillary' ? tubes === 0 : applies === 'asked' && !extras.includes(id)) continue;
    const pieces = per === 'cavity' ? (applies === 'capillary' ? tubes : unit.cavities.length) : 1;
    const share = per === 'line' ? over(ratio('1'), BigInt(quantity)) : ratio(String(pieces));
    const name = ref(put(id));
    charge('extras', per === 'line' ? `${look(name, 'Extras')}/${ref(q)}` : `${pieces}*${look(name, 'Extras')}`, times(share, ratio(rate)));
  }

  const areaSlots = slots.filter(({ family }) => ['glass', 'treatment', 'coating', 'assembly', 'gas'].includes(family));
  const areaList = put(`=${areaSlots.map(({ rounded }) => ref(rounded)).join('+')}`);
  const percentCharge = (family: UnitFamily, percent: string) => {
    const cell = put(`=${percent}`);
    charge(family, `${ref(areaList)}*${ref(cell)}/100`, null, { base: areaList, percent: cell, sign: 1 });
  };
  if (unit.shape.class !== 'rectangle') {
    const name = ref(put(unit.shape.class));
    percentCharge('shape', look(name, 'Shapes'));
    charge('shape', look(name, 'Shapes', 3), ratio(content.shapes.find(({ shape }) => shape === unit.shape.class)?.fixed ?? '0'));
  }
  const isStandard = put(`=COUNTIFS(${column('Standard', 'A')},${ref(w)},${column('Standard', 'B')},${ref(h)})`);
  percentCharge('size', `IF(${ref(isStandard)}>0,0,Settings!$A$3)`);
  // A fixed amount by the desk's choice of band has whole cents: no rounding, hence no tie.
  charge('size', `IF(${ref(isStandard)}>0,0,Settings!$A$4)`, null);
  const weight = put(imperial ? `=${weightKg}/0.45359237` : Number(weightKg));
  const kinds = {
    united: `${ref(w)}+${ref(h)}`,
    'long edge': `MAX(${ref(w)},${ref(h)})`,
    area: `${ref(w)}*${ref(h)}/${areaParts}`,
    weight: ref(weight),
  };
  for (const [kind, measure] of Object.entries(kinds)) {
    if (!content.sizeCharges.bands.some((band) => band.kind === kind)) continue;
    const highest = put(`=MAXIFS(${column('Bands', 'B')},${column('Bands', 'A')},"${kind}",${column('Bands', 'B')},"<"&(${measure}))`);
    const ofBand = (letter: string) =>
      `SUMIFS(${column('Bands', letter)},${column('Bands', 'A')},"${kind}",${column('Bands', 'B')},${ref(highest)})`;
    percentCharge('size', ofBand('C'));
    charge('size', ofBand('D'), null);
  }

  const sum = (of: readonly DraftSlot[]) => (of.length > 0 ? of.map(({ net }) => ref(net)).join('+') : '0');
  const others = slots.filter((slot) => !areaSlots.includes(slot));
  const key = ref(put(makeUpKey(unit)));
  const netRate = put(`=IFERROR(VLOOKUP(${key},${sheetRows('NetRates', 'B')},2,FALSE()),0)`);
  const netUnrounded = put(`=${ref(a)}*${ref(netRate)}`);
  const netRated = put(`=ROUND(${ref(netUnrounded)},2)`);
  const soFar = put(`=IF(${ref(netRate)}>0,${ref(netRated)},${sum(areaSlots)})+${sum(others)}`);
  slots.unshift({
    family: 'net rate',
    unrounded: netUnrounded,
    rounded: areaList,
    netUnrounded,
    net: netRated,
    exact: area,
    percentOf: { base: a, percent: netRate, sign: 1 },
    discounted: false,
  });

  const reduce = (family: 'quantity break' | 'promotion', base: number, percentFormula: string) => {
    const percent = put(`=${percentFormula}`);
    const unrounded = put(`=-${ref(base)}*${ref(percent)}/100`);
    const rounded = put(`=ROUND(${ref(unrounded)},2)`);
    const left = put(`=${ref(base)}+${ref(rounded)}`);
    slots.push({
      family,
      unrounded,
      rounded,
      netUnrounded: unrounded,
      net: rounded,
      exact: null,
      percentOf: { base, percent, sign: -1 },
      discounted: false,
    });
    return left;
  };
  const reached = put(`=MAXIFS(${column('Breaks', 'A')},${column('Breaks', 'A')},"<="&${ref(q)})`);
  const broken = reduce('quantity break', soFar, `SUMIFS(${column('Breaks', 'B')},${column('Breaks', 'A')},${ref(reached)})`);
  const unitPrice = reduce('promotion', broken, `MAXIFS(${column('Promotions', 'A')},${column('Promotions', 'B')},"<="&${ref(a)})`);
  const linePrice = put(`=ROUND(${ref(unitPrice)},2)*${ref(q)}`);
  return { cells, slots, unitPrice, linePrice };
}

/** 0 → A, 25 → Z, 26 → AA. */
function columnName(index: number): string {
  const last = String.fromCharCode(65 + (index % 26));
  return index < 26 ? last : columnName(Math.floor(index / 26) - 1) + last;
}
