import { type Reason } from '@shared/contracts/evaluation';
import { type UnitFamily } from '@shared/contracts/price-lists';
import { type Unit } from '@shared/contracts/units';
import { type Exact } from '@shared/money/exact';
import { type Billed, type RatedCharge, type Side } from './bill-size';
import { type Charge, type Sheet, wholeMinor } from './charge';
import { type CompiledList, type Rule } from './compile-list';
import { type CompiledTerms } from './compile-terms';
import { type Divisor } from './measures';

/** A unit while its charges are made. */
export interface UnitInHand {
  unit: Unit;
  quantity: number;
  /** extras asked for */
  extras: readonly string[];
  width: Side;
  height: Side;
  area: Billed;
  perimeter: Billed;
  list: CompiledList;
  terms: CompiledTerms;
  sheet: Sheet;
}

/** What is left of a list amount in minor units after the discount of the rule's family. */
export function netOf(listMinor: number, keeps: Exact | null): number {
  return keeps === null ? listMinor : wholeMinor(keeps.times(listMinor));
}

/**
 * Charges a rate at the billed area, not below the rate's minimum, and writes its row.
 *
 * @param place number of the lite, surface or cavity; 0 where there is but one
 * @returns the list amount
 */
export function chargeByArea(hand: UnitInHand, rule: Rule, place: number): number {
  const { area, list } = hand;
  const made = area.charged[rule.number] ?? rated(hand, rule, area, list.measures.areaDivisor);
  const { minimum } = rule;
  const label = rule.labels[place] ?? '';
  hand.sheet.charges.push(
    (made.rows[place] ??=
      minimum?.minor === made.listMinor
        ? rowOf(hand, rule.family, `${label}, minimum`, '1', 'cavity', minimum.rate, made, rule.id)
        : rowOf(hand, rule.family, label, area.text, list.measures.areaUnit, rule.rate, made, rule.id)),
  );
  return made.listMinor;
}

/** Charges a rate at the billed perimeter and writes its row; `place` as in `chargeByArea`. */
export function chargeByPerimeter(hand: UnitInHand, rule: Rule, place: number): void {
  const { perimeter, list } = hand;
  const made = perimeter.charged[rule.number] ?? rated(hand, rule, perimeter, list.measures.lengthDivisor);
  const label = rule.labels[place] ?? '';
  const row = (made.rows[place] ??= rowOf(hand, rule.family, label, perimeter.text, list.measures.lengthUnit, rule.rate, made, rule.id));
  hand.sheet.charges.push(row);
}

function rated({ terms }: UnitInHand, rule: Rule, billed: Billed, divisor: Divisor | null): RatedCharge {
  const amount = wholeQuotient(billed.parts.times(rule.factor), divisor);
  const listMinor = rule.minimum ? Math.max(amount, rule.minimum.minor) : amount;
  const netMinor = netOf(listMinor, terms.discounts[rule.family].keeps);
  const made: RatedCharge = { listMinor, netMinor, rows: new Array<undefined>(rule.labels.length) };
  billed.charged[rule.number] = made;
  return made;
}

/** A positive amount divided and rounded half up in one step, so that no cut quotient is ever rounded. */
export function wholeQuotient(amount: Exact, divisor: Divisor | null): number {
  if (divisor === null) return wholeMinor(amount);
  const whole = amount.plus(divisor.half).dividedToIntegerBy(divisor.by).toNumber();
  if (!Number.isSafeInteger(whole)) throw new RangeError(`${amount.toString()} minor units are too many`);
  return whole;
}

/** Writes one row of a unit family, discounted as the terms have it. */
export function addRow(
  hand: UnitInHand,
  family: UnitFamily,
  label: string,
  quantity: string,
  unit: string,
  rate: string,
  listMinor: number,
  rule: string,
): void {
  const netMinor = netOf(listMinor, hand.terms.discounts[family].keeps);
  hand.sheet.charges.push(rowOf(hand, family, label, quantity, unit, rate, { listMinor, netMinor }, rule));
}

function rowOf(
  { terms }: UnitInHand,
  family: UnitFamily,
  label: string,
  quantity: string,
  unit: string,
  rate: string,
  { listMinor, netMinor }: Pick<Charge, 'listMinor' | 'netMinor'>,
  rule: string,
): Charge {
  const { percent, reason } = terms.discounts[family];
  return { family, label, quantity, unit, rate, listMinor, discountPercent: percent, discountReason: reason, netMinor, rule };
}

/** Refuses a product that the list has no rate for: a list never prices at nothing. */
export function refuse({ sheet, list }: UnitInHand, product: string, pointer: string): void {
  const refusal: Reason = {
    code: 'no-rate',
    detail: `${list.name} has no rate for ${product}`,
    limit: 'products with a rate in the list',
    actual: product,
    nearest: null,
    nearestValue: null,
    pointer,
  };
  sheet.refusals.push(refusal);
}
