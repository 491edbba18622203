import { type Catalogue } from '@shared/contracts/catalogue';
import { type PriceListVersion, type PriceTerms } from '@shared/contracts/price-lists';
import { type BilledBefore } from './bill-size';
import { type CompiledList, compileList } from './compile-list';
import { compileTerms } from './compile-terms';
import { type LineToPrice, priceCompiled, type UnitPricing } from './price-unit';

/** Prices lines of one list on one dealer's terms, one after another. */
export type Pricer = (line: LineToPrice) => UnitPricing;

/**
 * A pricer whose lines share what they have in common: each side is billed once, and each rate is
 * taken once at a billed area or perimeter. Every answer equals that of `priceUnit`; sheets may hold the same
 * rows, which nobody alters. It keeps what it has billed, so it is for one piece of work.
 */
export function createPricer(list: CompiledList, terms: PriceTerms): Pricer {
  const compiledTerms = compileTerms(terms, list);
  const before: BilledBefore = { sides: new Map(), areas: new Map(), perimeters: new Map() };
  return (line) => priceCompiled(line, list, compiledTerms, before);
}

/** Prices many lines by one version on one dealer's terms, in their order. */
export function priceLines(
  lines: readonly LineToPrice[],
  version: PriceListVersion,
  terms: PriceTerms,
  catalogue: Catalogue,
): UnitPricing[] {
  const price = createPricer(compileList(version, catalogue), terms);
  return lines.map(price);
}
