import { type PriceTerms } from '@shared/contracts/price-lists';
import { type Stores } from '../dependencies';

/**
 * What a trade account's prices depend on beside unit and list, on a day of the fabricator's:
 * its tier, and the contracts and promotions that run on that day.
 */
export function termsOf(
  account: { id: string; fabricatorId: string; tier: string },
  on: string,
  promotionCode: string | null,
  { terms }: Pick<Stores, 'terms'>,
): PriceTerms {
  const runs = ({ from, until }: { from: string; until: string | null }) => from <= on && (until === null || on <= until);
  return {
    tier: account.tier,
    contracts: terms.contractsOf(account.id).filter(runs),
    promotions: terms.promotionsOf(account.fabricatorId).filter(runs),
    promotionCode,
    on,
  };
}
