import { type Catalogue } from '@shared/contracts/catalogue';
import { type Reason } from '@shared/contracts/evaluation';
import { type PriceListVersion, type PriceTerms } from '@shared/contracts/price-lists';
import { type Unit } from '@shared/contracts/units';
import { makeUpKey } from '@shared/glazing/make-up-key';
import { type Currency } from '@shared/money/currencies';
import { chargeAssembly, chargeCoating, chargeGas, chargeGlass, chargeTreatment } from './area-charges';
import { billArea, type BilledBefore, billPerimeter, billSide } from './bill-size';
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

/** As `priceUnit`, for a list and terms already compiled; `before` holds what lines may share. */
export function priceCompiled(line: LineToPrice, list: CompiledList, terms: CompiledTerms, before?: BilledBefore): UnitPricing {
  const weighed = weighLine(line, list);
  if ('refusals' in weighed) return weighed;
  const { weightKg } = weighed;
  const { unit, quantity, extras = [] } = line;
  const width = billSide(unit.width, list, before);
  const height = billSide(unit.height, list, before);
  const area = billArea(width, height, list, before);
  const perimeter = billPerimeter(width, height, list, before);
  const sheet: Sheet = { charges: [], refusals: [], areaMinor: 0 };
  const hand: UnitInHand = { unit, quantity, extras, width, height, area, perimeter, list, terms, sheet };

  chargeAll(hand, sizeFactsOf(width, height, weightKg, list));
  if (sheet.refusals.length > 0) return { refusals: sheet.refusals };
  const netRate = terms.netRates.size > 0 ? terms.netRates.get(makeUpKey(unit)) : undefined;
  if (netRate) replaceByNetRate(hand, netRate);
  const unitPriceMinor = reduce(hand);
  const linePriceMinor = unitPriceMinor * quantity;
  if (!Number.isSafeInteger(linePriceMinor)) throw new RangeError(`${quantity} × ${unitPriceMinor} minor units are too many`);
  return { priced: { currency: list.currency, quantity, charges: sheet.charges, unitPriceMinor, linePriceMinor, weightKg } };
}

/** Writes the list charges in the order of the families. */
function chargeAll(hand: UnitInHand, facts: SizeFacts): void {
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
}

/** Writes quantity break and promotion. Returns the sum of all rows, which is the unit price. */
function reduce({ sheet: { charges }, quantity, area, list, terms }: UnitInHand): number {
  let netMinor = 0;
  for (const row of charges) netMinor += row.netMinor;
  const broken = quantityBreakOf(quantity, list);
  const breakRow = broken && quantityBreakRow(netMinor, broken, list);
  if (breakRow) netMinor += breakRow.netMinor;
  const promoted = terms.promotions.length > 0 ? promotionRow(charges, netMinor, area.parts, broken, terms, list) : undefined;
  if (promoted) netMinor += promoted.netMinor;
  if (breakRow) charges.push(breakRow);
  if (promoted) charges.push(promoted);
  return netMinor;
}

/** The weight of one unit where the list asks for it. */
function weighLine(line: LineToPrice, list: CompiledList): { weightKg: string | null } | { refusals: Reason[] } {
  if (!list.asksForWeight || line.weightKg !== undefined) return { weightKg: line.weightKg ?? null };
  return weighUnit(line.unit, list.products.catalogue);
}
