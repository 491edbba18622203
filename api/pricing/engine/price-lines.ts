import { type Catalogue } from '@shared/contracts/catalogue';
import { type PriceListVersion, type PriceTerms } from '@shared/contracts/price-lists';
import { makeUpKey } from '@shared/glazing/make-up-key';
import { type BilledSize, billSteps, stepsOf } from './bill-size';
import { type CompiledList, compileList } from './compile-list';
import { type CompiledTerms, compileTerms } from './compile-terms';
import { chargeUnit, type LineToPrice, measureLine, toLine, type UnitPricing, type UnitSheet } from './price-unit';
import { quantityBreakOf } from './reductions';
import { type SizeFacts, sizeFactsOf } from './size-charges';

/**
 * Prices many lines by one version on one dealer's terms, in their order. Lines that are billed
 * alike share their charges: each rate is taken once at a billed size, and a whole sheet is used
 * again for a line equal to an earlier one in everything that the sheet depends on. The result
 * equals that of `priceUnit` line by line; rows may be the same objects and are not to be altered.
 */
export function priceLines(
  lines: readonly LineToPrice[],
  version: PriceListVersion,
  terms: PriceTerms,
  catalogue: Catalogue,
): UnitPricing[] {
  const list = compileList(version, catalogue);
  const compiledTerms = compileTerms(terms, list);
  const sizes = new Map<string, BilledSize>();
  const sheets = new Map<string, UnitSheet>();
  return lines.map((line) => priceLine(line, list, compiledTerms, sizes, sheets));
}

function priceLine(
  line: LineToPrice,
  list: CompiledList,
  terms: CompiledTerms,
  sizes: Map<string, BilledSize>,
  sheets: Map<string, UnitSheet>,
): UnitPricing {
  const measured = measureLine(line, list);
  if ('refusals' in measured) return measured;
  const { width, height, weightKg } = measured;
  const { increment } = list.measures;
  const widthSteps = stepsOf(width, increment);
  const heightSteps = stepsOf(height, increment);
  const sizeKey = `${widthSteps}x${heightSteps}`;
  let size = sizes.get(sizeKey);
  if (!size) sizes.set(sizeKey, (size = billSteps(widthSteps, heightSteps, list)));

  const facts = sizeFactsOf(width, height, weightKg, list);
  const key = `${sizeKey} ${everythingElse(line, facts, list)}`;
  let sheet = sheets.get(key);
  if (!sheet) sheets.set(key, (sheet = chargeUnit(line, size, facts, list, terms)));
  return toLine(line, sheet, list, weightKg);
}

/** What a sheet depends on beside billed size, list and terms. */
function everythingElse({ unit, quantity, extras }: LineToPrice, facts: SizeFacts, list: CompiledList): string {
  const { grid } = unit;
  return [
    makeUpKey(unit),
    facts.standard ? 'standard' : '',
    facts.bands.map(({ id }) => id).join(),
    unit.shape.class,
    grid ? `${grid.bar}:${grid.across}:${grid.down}` : '',
    unit.lites.map(({ edgeWork }) => edgeWork ?? '').join(),
    unit.cavities.map(({ capillary }) => (capillary ? '1' : '0')).join(''),
    extras?.join() ?? '',
    list.sharesByQuantity ? quantity : (quantityBreakOf(quantity, list)?.atLeast ?? 0),
  ].join(' ');
}
