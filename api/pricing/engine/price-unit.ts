import { type Catalogue } from '@shared/contracts/catalogue';
import { type Reason } from '@shared/contracts/evaluation';
import { type PriceListVersion, type PriceTerms } from '@shared/contracts/price-lists';
import { type Unit } from '@shared/contracts/units';
import { makeUpKey } from '@shared/glazing/make-up-key';
import { type Currency } from '@shared/money/currencies';
import { chargeAssembly, chargeCoating, chargeGas, chargeGlass, chargeTreatment } from './area-charges';
import { billSide, type BilledSize, billSize, type Side } from './bill-size';
import { type Charge, type Sheet } from './charge';
import { type CompiledList, compileList } from './compile-list';
import { type CompiledTerms, compileTerms } from './compile-terms';
import { chargeExtras } from './extra-charges';
import { chargeEdgeWork, chargeGrid, chargeSpacer } from './length-charges';
import { weighUnit } from './measure-line';
import { promotionRow, quantityBreakOf, quantityBreakRow, replaceByNetRate } from './reductions';
import { chargeShape, chargeSize, type SizeFacts, sizeFactsOf } from './size-charges';
import { type UnitInHand } from './unit-in-hand';

/** What is to be priced: a unit, how many of it, and the list's extras that are asked for. */
export interface LineToPrice {
  unit: Unit;
  quantity: number;
  extras?: readonly string[] | undefined;
  /** weight of one unit in kg, decimal string; reckoned from the unit where it is left out */
  weightKg?: string | undefined;
}

/** A charge sheet with its sums: the rows sum to the unit price, and a line is unit price × quantity. */
export interface PricedUnit {
  currency: Currency;
  quantity: number;
  charges: readonly Charge[];
  unitPriceMinor: number;
  linePriceMinor: number;
  /** kg of one unit, decimal string; null where the list asks for no weight */
  weightKg: string | null;
}

export type UnitPricing = { priced: PricedUnit } | { refusals: Reason[] };

/**
 * Prices a unit by one version of a list on a dealer's terms. A list refuses what it has no rate
 * for, each product with a pointer into the unit (`/extras/0` into the line); it never prices it at
 * nothing. Pure: the same arguments give the same sheet for ever.
 *
 * @throws TypeError when a rate or a size is not a decimal string
 */
export function priceUnit(line: LineToPrice, version: PriceListVersion, terms: PriceTerms, catalogue: Catalogue): UnitPricing {
  const list = compileList(version, catalogue);
  return priceCompiled(line, list, compileTerms(terms, list));
}

/** Sides and sizes billed before, for one list and one dealer's terms: what lines may share. */
export interface BilledBefore {
  sides: Map<string, Side>;
  sizes: Map<string, BilledSize>;
}

/** As `priceUnit`, for a list and terms already compiled. */
export function priceCompiled(line: LineToPrice, list: CompiledList, terms: CompiledTerms, before?: BilledBefore): UnitPricing {
  const weighed = weighLine(line, list);
  if ('refusals' in weighed) return weighed;
  const { weightKg } = weighed;
  const width = sideOf(line.unit.width, list, before);
  const height = sideOf(line.unit.height, list, before);
  const size = sizeOf(width, height, list, before);
  return toLine(line, chargeUnit(line, size, sizeFactsOf(width, height, weightKg, list), list, terms), list, weightKg);
}

function sideOf(text: string, list: CompiledList, before: BilledBefore | undefined): Side {
  const known = before?.sides.get(text);
  if (known) return known;
  const side = billSide(text, list);
  before?.sides.set(text, side);
  return side;
}

function sizeOf(width: Side, height: Side, list: CompiledList, before: BilledBefore | undefined): BilledSize {
  if (!before) return billSize(width.steps, height.steps, list);
  const key = `${width.steps}x${height.steps}`;
  const known = before.sizes.get(key);
  if (known) return known;
  const size = billSize(width.steps, height.steps, list);
  before.sizes.set(key, size);
  return size;
}

/** The weight of one unit where the list asks for it. */
function weighLine(line: LineToPrice, list: CompiledList): { weightKg: string | null } | { refusals: Reason[] } {
  if (!list.asksForWeight || line.weightKg !== undefined) return { weightKg: line.weightKg ?? null };
  return weighUnit(line.unit, list.products.catalogue);
}

/** Rows and their sum, which is the unit price; or why the list does not price it. */
type UnitSheet = { charges: readonly Charge[]; unitPriceMinor: number } | { refusals: Reason[] };

/** All rows of one unit in their order: list charges, net rate, quantity break, promotion. */
function chargeUnit(line: LineToPrice, size: BilledSize, facts: SizeFacts, list: CompiledList, terms: CompiledTerms): UnitSheet {
  const { unit, quantity, extras = [] } = line;
  const sheet: Sheet = { charges: [], refusals: [], areaMinor: 0 };
  const hand: UnitInHand = { unit, quantity, extras, size, list, terms, sheet };

  chargeGlass(hand);
  chargeTreatment(hand);
  chargeCoating(hand);
  chargeAssembly(hand);
  chargeSpacer(hand);
  chargeGas(hand);
  chargeGrid(hand);
  chargeEdgeWork(hand);
  chargeExtras(hand);
  chargeShape(hand);
  chargeSize(hand, facts);
  if (sheet.refusals.length > 0) return { refusals: sheet.refusals };

  const netRate = terms.netRates.size > 0 ? terms.netRates.get(makeUpKey(unit)) : undefined;
  if (netRate) replaceByNetRate(hand, netRate);

  const { charges } = sheet;
  let unitPriceMinor = 0;
  for (const { netMinor } of charges) unitPriceMinor += netMinor;
  const broken = quantityBreakOf(quantity, list);
  const breakRow = broken && quantityBreakRow(unitPriceMinor, broken, list);
  const afterBreak = unitPriceMinor + (breakRow?.netMinor ?? 0);
  const promoted = terms.promotions.length > 0 ? promotionRow(charges, afterBreak, size.areaParts, broken, terms, list) : undefined;
  if (breakRow) charges.push(breakRow);
  if (promoted) charges.push(promoted);
  return { charges, unitPriceMinor: afterBreak + (promoted?.netMinor ?? 0) };
}

/** A line of so many units of a sheet. */
function toLine(line: LineToPrice, sheet: UnitSheet, { currency }: CompiledList, weightKg: string | null): UnitPricing {
  if ('refusals' in sheet) return sheet;
  const { charges, unitPriceMinor } = sheet;
  const linePriceMinor = unitPriceMinor * line.quantity;
  if (!Number.isSafeInteger(linePriceMinor)) throw new RangeError(`${line.quantity} × ${unitPriceMinor} minor units are too many`);
  return { priced: { currency, quantity: line.quantity, charges, unitPriceMinor, linePriceMinor, weightKg } };
}
