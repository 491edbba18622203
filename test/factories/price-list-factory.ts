import { type PriceListContent, type PriceListVersion, type PriceTerms } from '@shared/contracts/price-lists';
import { northmereList } from '../../seeds/demo/price-lists';

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
