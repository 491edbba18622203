import { dayIn } from '@shared/calendar/days';
import { type Destination, type PriceListVersion, type PriceTerms } from '@shared/contracts/price-lists';
import { type PriceRequest } from '@shared/contracts/prices';
import { type TradeAccountRow } from '../companies/company-store';
import { type Stores } from '../dependencies';
import { destinationOf } from './destination-of';
import { leadTimeDays } from './lead-time';
import { termsOf } from './terms-of';

/** All that a price depends on beside the lines. */
export interface Circumstances {
  /** undefined when the maker has no list in force */
  version: PriceListVersion | undefined;
  terms: PriceTerms;
  /** null when no ship-to is named and the dealer's book is empty: no delivery, no tax */
  destination: Destination | null;
  /** working days; null when the maker has no such class */
  leadTimeDays: number | null;
}

/**
 * The list in force at an account's maker at an instant (UTC epoch ms), and the account's terms,
 * destination and lead time on the day it then is at the maker's.
 *
 * @throws Refusal `invalid` at `/shipTo` for an address that is not the dealer's
 */
export function circumstancesOf(
  account: TradeAccountRow,
  { shipTo, leadTimeClass, promotionCode }: Pick<PriceRequest, 'shipTo' | 'leadTimeClass' | 'promotionCode'>,
  at: number,
  stores: Pick<Stores, 'companies' | 'priceLists' | 'terms'>,
): Circumstances {
  const maker = stores.companies.company(account.fabricatorId);
  const plant = stores.companies.fabricator(account.fabricatorId);
  if (!maker || !plant) throw new Error(`no fabricator ${account.fabricatorId}`);
  const on = dayIn(maker.timeZone, at);
  const nowhere = shipTo === undefined && !stores.companies.firstAddressOf(account.dealerId);
  return {
    version: stores.priceLists.inForce(account.fabricatorId, account.currency, at),
    terms: termsOf(account, on, promotionCode ?? null, stores),
    destination: nowhere ? null : destinationOf(account.dealerId, shipTo, on, stores),
    leadTimeDays: leadTimeDays(plant.calendar, leadTimeClass ?? null),
  };
}
