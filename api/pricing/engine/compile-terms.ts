import { type PriceTerms, type Promotion, type UnitFamily } from '@shared/contracts/price-lists';
import { type Exact, exact } from '@shared/money/exact';
import { type CompiledList } from './compile-list';
import { type Discounts, discountOf, withoutTier } from './discounts';

/** A promotion that may apply, once its conditions of date, tier and code are met. */
export interface OpenPromotion {
  promotion: Promotion;
  /** parts of area that the billed unit must have; null for any */
  minimumArea: Exact | null;
  /** of the whole price, or by family */
  parts: { all: Exact } | { families: ReadonlyMap<UnitFamily, Exact> };
  label: string;
}

/** A dealer's terms at one list on one day. */
export interface CompiledTerms {
  discounts: Discounts;
  /** by make-up */
  netRates: ReadonlyMap<string, { id: string; rate: string; factor: Exact }>;
  promotions: readonly OpenPromotion[];
}

/**
 * What of the terms holds on the day of the price. Of two contract prices for the same family or
 * make-up the one that began later holds; a contract goes before the tier. A tier the list does not
 * know takes nothing off.
 */
export function compileTerms(terms: PriceTerms, list: CompiledList): CompiledTerms {
  const { measures, minorPer } = list;
  const ofTier = list.tiers.get(terms.tier) ?? withoutTier;
  if (terms.contracts.length === 0 && terms.promotions.length === 0) return { discounts: ofTier, netRates: new Map(), promotions: [] };

  const discounts = { ...ofTier };
  const inForce = terms.contracts
    .filter(({ from, until }) => from <= terms.on && (until === null || terms.on <= until))
    .sort((a, b) => (a.from < b.from ? -1 : a.from > b.from ? 1 : 0));
  const netRates = new Map<string, { id: string; rate: string; factor: Exact }>();
  for (const contract of inForce) {
    if (contract.kind === 'percent') discounts[contract.family] = discountOf(contract.percent, 'contract');
    else {
      const factor = exact(contract.rate).times(minorPer).times(measures.perArea);
      netRates.set(contract.makeUp, { id: contract.id, rate: contract.rate, factor });
    }
  }
  return {
    discounts,
    netRates,
    promotions: terms.promotions.filter((offered) => isOpen(offered, terms)).map((offered) => open(offered, list)),
  };
}

function isOpen({ from, until, tiers, code }: Promotion, terms: PriceTerms): boolean {
  if (terms.on < from || until < terms.on) return false;
  if (tiers.length > 0 && !tiers.includes(terms.tier)) return false;
  return code === null || code === terms.promotionCode;
}

function open(promotion: Promotion, { measures }: CompiledList): OpenPromotion {
  const { percents, name } = promotion;
  const minimumArea = promotion.minimumArea === null ? null : exact(promotion.minimumArea).times(measures.areaParts);
  if ('all' in percents) {
    return { promotion, minimumArea, parts: { all: exact(percents.all).dividedBy(100) }, label: `${name}, ${percents.all} %` };
  }
  const named = Object.entries(percents) as [UnitFamily, string][];
  return {
    promotion,
    minimumArea,
    parts: { families: new Map(named.map(([family, percent]) => [family, exact(percent).dividedBy(100)])) },
    label: `${name}, ${named.map(([family, percent]) => `${percent} % off ${family}`).join(', ')}`,
  };
}
