import { type PriceListContent, type PriceListVersion, type PriceTerms } from '@shared/contracts/price-lists';
import { type Charge } from '@api/pricing/engine/charge';
import { type LineToPrice, type PricedUnit, priceUnit } from '@api/pricing/engine/price-unit';
import { northmereList } from '../../seeds/demo/price-lists';
import { catalogueFactory } from './catalogue-factory';

/** A version of the imperial demo list, whose rates are those of the worked example of pricing. */
export function priceListFactory(content: Partial<PriceListContent> = {}, overrides: Partial<PriceListVersion> = {}): PriceListVersion {
  return {
    version: 'northmere.3',
    name: 'Northmere trade list 3',
    effectiveFrom: '2026-01-01T00:00:00.000Z',
    content: { ...structuredClone(northmereList), ...content },
    ...overrides,
  };
}

/** Tier B, nothing agreed and nothing promoted. */
export function priceTermsFactory(overrides: Partial<PriceTerms> = {}): PriceTerms {
  return { tier: 'B', contracts: [], promotions: [], promotionCode: null, on: '2026-09-15', ...overrides };
}

const catalogue = catalogueFactory();

/** The sheet of a line that the list has all rates for. @throws Error with the refusals otherwise */
export function pricedUnitFactory(line: LineToPrice, list = priceListFactory(), terms = priceTermsFactory()): PricedUnit {
  const answer = priceUnit(line, list, terms, catalogue);
  if ('refusals' in answer) throw new Error(JSON.stringify(answer.refusals));
  return answer.priced;
}

/** The one row of a sheet with this label. @throws Error that names the labels there are */
export function rowOf({ charges }: PricedUnit, label: string): Charge {
  const found = charges.find((row) => row.label === label);
  if (!found) throw new Error(`no row “${label}” among ${charges.map((row) => row.label).join('; ')}`);
  return found;
}
