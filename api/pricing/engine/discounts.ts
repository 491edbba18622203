import { type PriceListContent, type UnitFamily, unitFamilies } from '@shared/contracts/price-lists';
import { Exact, exact } from '@shared/money/exact';

/** What comes off one family of charges, and why. */
export interface Discount {
  percent: string;
  reason: string | null;
  /** what is left of the list amount, 0.88 after 12 %; null where nothing comes off */
  keeps: Exact | null;
}

export type Discounts = Readonly<Record<UnitFamily, Discount>>;

export function discountOf(percent: string | undefined, reason: string): Discount {
  const taken = exact(percent ?? '0');
  if (taken.isZero()) return { percent: percent ?? '0', reason: null, keeps: null };
  return { percent: percent ?? '0', reason, keeps: new Exact(100).minus(taken).dividedBy(100) };
}

const byFamily = (of: (family: UnitFamily) => Discount) =>
  Object.fromEntries(unitFamilies.map((family) => [family, of(family)])) as Discounts;

export const withoutTier: Discounts = byFamily(() => discountOf('0', ''));

/** The discounts of each tier of a list. */
export function compileTiers({ tiers }: Pick<PriceListContent, 'tiers'>): ReadonlyMap<string, Discounts> {
  return new Map(tiers.map(({ tier, percents }) => [tier, byFamily((family) => discountOf(percents[family], `tier ${tier}`))]));
}
