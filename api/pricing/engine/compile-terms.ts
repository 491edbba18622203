import { type PriceTerms, type Promotion, type UnitFamily, unitFamilies } from '@shared/contracts/price-lists';
import { Exact, exact } from '@shared/money/exact';
import { type CompiledList } from './compile-list';

export interface Discount {
  percent: string;
  reason: string | null;
  /** what is left of the list amount, 0.88 after 12 %; null where nothing comes off */
  keeps: Exact | null;
}

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
  discounts: Readonly<Record<UnitFamily, Discount>>;
  /** by make-up */
  netRates: ReadonlyMap<string, { id: string; rate: string; factor: Exact }>;
  promotions: readonly OpenPromotion[];
}

const nothingOff: Discount = { percent: '0', reason: null, keeps: null };

/**
 * What of the terms holds on the day of the price. Of two contract prices for the same family or
 * make-up the one that began later holds; a contract goes before the tier. A tier the list does not
 * know takes nothing off.
 */
export function compileTerms(terms: PriceTerms, list: CompiledList): CompiledTerms {
  const { measures, minorPer } = list;
  const tier = list.content.tiers.find((entry) => entry.tier === terms.tier);
  const inForce = terms.contracts
    .filter(({ from, until }) => from <= terms.on && (until === null || terms.on <= until))
    .sort((a, b) => (a.from < b.from ? -1 : a.from > b.from ? 1 : 0));

  const discounts = Object.fromEntries(
    unitFamilies.map((family) => [family, tier ? off(tier.percents[family], `tier ${tier.tier}`) : nothingOff]),
  ) as Record<UnitFamily, Discount>;
  const netRates = new Map<string, { id: string; rate: string; factor: Exact }>();
  for (const contract of inForce) {
    if (contract.kind === 'percent') discounts[contract.family] = off(contract.percent, 'contract');
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

function off(percent: string | undefined, reason: string): Discount {
  if (percent === undefined) return nothingOff;
  const taken = exact(percent);
  return taken.isZero() ? { percent, reason: null, keeps: null } : { percent, reason, keeps: new Exact(100).minus(taken).dividedBy(100) };
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
