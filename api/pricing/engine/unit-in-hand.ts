import { type Reason } from '@shared/contracts/evaluation';
import { type UnitFamily } from '@shared/contracts/price-lists';
import { type Unit } from '@shared/contracts/units';
import { type Exact } from '@shared/money/exact';
import { type Amount, type BilledSize } from './bill-size';
import { type Sheet, wholeMinor } from './charge';
import { type CompiledList, type Rule } from './compile-list';
import { type CompiledTerms } from './compile-terms';
import { type Divisor } from './measures';

/** A unit while its charges are made. */
export interface UnitInHand {
  unit: Unit;
  quantity: number;
  /** extras asked for */
  extras: readonly string[];
  size: BilledSize;
  list: CompiledList;
  terms: CompiledTerms;
  sheet: Sheet;
}

/** What is left of a list amount in minor units after the discount of the rule's family. */
export function netOf(listMinor: number, keeps: Exact | null): number {
  return keeps === null ? listMinor : wholeMinor(keeps.times(listMinor));
}

/** List and net amount of an area rate at the billed area, not below the rate's minimum. */
export function areaAmount(hand: UnitInHand, rule: Rule): Amount {
  return amountOf(hand, rule, hand.size.areaParts, hand.list.measures.areaDivisor);
}

/** List and net amount of a length rate at the billed perimeter. */
export function perimeterAmount(hand: UnitInHand, rule: Rule): Amount {
  return amountOf(hand, rule, hand.size.perimeterParts, hand.list.measures.lengthDivisor);
}

function amountOf({ size, terms }: UnitInHand, rule: Rule, parts: Exact, divisor: Divisor | null): Amount {
  const made = size.amounts.get(rule);
  if (made) return made;
  const rated = wholeQuotient(parts.times(rule.factor), divisor);
  const listMinor = rule.minimum ? Math.max(rated, rule.minimum.minor) : rated;
  const amount = { listMinor, netMinor: netOf(listMinor, terms.discounts[rule.family].keeps) };
  size.amounts.set(rule, amount);
  return amount;
}

/** A positive amount divided and rounded half up in one step, so that no cut quotient is ever rounded. */
export function wholeQuotient(amount: Exact, divisor: Divisor | null): number {
  if (divisor === null) return wholeMinor(amount);
  const whole = amount.plus(divisor.half).dividedToIntegerBy(divisor.by).toNumber();
  if (!Number.isSafeInteger(whole)) throw new RangeError(`${amount.toString()} minor units are too many`);
  return whole;
}

/** Writes the row of a rate. */
export function addCharge(hand: UnitInHand, rule: Rule, label: string, amount: Amount, quantity: string, unit: string): void {
  addRow(hand, rule.family, label, quantity, unit, rule.rate, amount, rule.id);
}

/** Writes one row of a unit family. */
export function addRow(
  { sheet, terms }: UnitInHand,
  family: UnitFamily,
  label: string,
  quantity: string,
  unit: string,
  rate: string,
  { listMinor, netMinor }: Amount,
  rule: string,
): void {
  const { percent, reason } = terms.discounts[family];
  sheet.charges.push({ family, label, quantity, unit, rate, listMinor, discountPercent: percent, discountReason: reason, netMinor, rule });
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
