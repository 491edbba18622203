import { type RowFamily, areaFamilies, type UnitFamily } from '@shared/contracts/price-lists';
import { Exact } from '@shared/money/exact';
import { amountOf } from '@shared/money/money';
import { type Charge, decimalText, partOf, wholeMinor } from './charge';
import { type CompiledList, type QuantityBreak } from './compile-list';
import { type CompiledTerms, type OpenPromotion } from './compile-terms';
import { type UnitInHand, wholeQuotient } from './unit-in-hand';

/** What comes after the list charges: a net rate in place of the area charges, the quantity break, the promotion. */

const isAreaFamily = (family: RowFamily) => (areaFamilies as readonly RowFamily[]).includes(family);

/**
 * Puts one row in place of the area charges. Its list amount is theirs, for the list price of a
 * unit is the same for every dealer.
 */
export function replaceByNetRate(hand: UnitInHand, { id, rate, factor }: { id: string; rate: string; factor: Exact }): void {
  const { sheet, area, list } = hand;
  const row: Charge = {
    family: 'net rate',
    label: 'net rate for this make-up',
    quantity: area.text,
    unit: list.measures.areaUnit,
    rate,
    listMinor: sheet.areaMinor,
    discountPercent: '0',
    discountReason: 'contract',
    netMinor: wholeQuotient(area.parts.times(factor), list.measures.areaDivisor),
    rule: `contract/${id}`,
  };
  sheet.charges = [row, ...sheet.charges.filter(({ family }) => !isAreaFamily(family))];
}

/** The highest break that the line's quantity reaches. */
export function quantityBreakOf(quantity: number, list: CompiledList): QuantityBreak | undefined {
  return list.quantityBreaks.find(({ atLeast }) => quantity >= atLeast);
}

/** The row of the quantity break, on the net unit price so far. */
export function quantityBreakRow(netMinor: number, { part, rate, label, id }: QuantityBreak, list: CompiledList): Charge | undefined {
  if (part.isZero()) return undefined;
  return reduction('quantity break', label, amountOf(netMinor, list.currency), list, rate, -partOf(netMinor, part), id);
}

/**
 * The row of the promotion that takes most off, the earlier of two alike; undefined when none
 * applies. One on everything is taken on the net unit price so far; one by family on the net of the
 * families, less the share that the quantity break took of it. A net rate belongs to no family.
 */
export function promotionRow(
  charges: readonly Charge[],
  netMinor: number,
  areaParts: Exact,
  broken: QuantityBreak | undefined,
  terms: CompiledTerms,
  list: CompiledList,
): Charge | undefined {
  let best: Charge | undefined;
  for (const open of terms.promotions) {
    if (open.minimumArea && areaParts.lessThan(open.minimumArea)) continue;
    const row = rowOf(open, charges, netMinor, broken, list);
    if (row && row.netMinor < (best?.netMinor ?? 0)) best = row;
  }
  return best;
}

function rowOf(
  { promotion, parts, label }: OpenPromotion,
  charges: readonly Charge[],
  netMinor: number,
  broken: QuantityBreak | undefined,
  list: CompiledList,
): Charge | undefined {
  const id = `promotion/${promotion.id}`;
  if ('all' in parts) {
    return reduction(
      'promotion',
      label,
      amountOf(netMinor, list.currency),
      list,
      decimalText(parts.all.negated()),
      -partOf(netMinor, parts.all),
      id,
    );
  }
  const left = new Exact(1).minus(broken?.part ?? 0);
  let base = new Exact(0);
  let taken = new Exact(0);
  for (const { family, netMinor: ofRow } of charges) {
    const part = parts.families.get(family as UnitFamily);
    if (!part) continue;
    const share = left.times(ofRow);
    base = base.plus(share);
    taken = taken.plus(share.times(part));
  }
  if (base.isZero()) return undefined;
  const quantity = decimalText(base.dividedBy(list.minorPer));
  return reduction('promotion', label, quantity, list, decimalText(taken.dividedBy(base).negated()), -wholeMinor(taken), id);
}

function reduction(
  family: 'quantity break' | 'promotion',
  label: string,
  quantity: string,
  { currency }: CompiledList,
  rate: string,
  netMinor: number,
  rule: string,
): Charge {
  return {
    family,
    label,
    quantity,
    unit: currency,
    rate,
    listMinor: 0,
    discountPercent: '0',
    discountReason: null,
    netMinor: netMinor === 0 ? 0 : netMinor,
    rule,
  };
}
