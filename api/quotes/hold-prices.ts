import { type Destination, type PriceListVersion } from '@shared/contracts/price-lists';
import { Refusal } from '@shared/contracts/problems';
import { type TradeAccountRow } from '../companies/company-store';
import { type Dependencies } from '../dependencies';
import { type Circumstances, circumstancesOf } from '../pricing/circumstances-of';

/** What a quote holds beside its lines. */
export type Holding = Circumstances & { version: PriceListVersion; destination: Destination };

/**
 * The list in force now at the account's maker, the account's terms today and where goods go.
 *
 * @param shipTo an address of the dealer's; null for its first
 * @throws Refusal `no-price-list`, or `invalid` at `/shipTo`
 */
export function holdPrices(
  account: TradeAccountRow,
  { shipTo, leadTimeClass }: { shipTo: string | null; leadTimeClass: string | null },
  { stores, clock }: Pick<Dependencies, 'stores' | 'clock'>,
): Holding {
  const asked = { shipTo: shipTo ?? undefined, leadTimeClass: leadTimeClass ?? undefined };
  const { version, destination, ...rest } = circumstancesOf(account, asked, clock(), stores);
  if (!version) {
    const detail = `${account.fabricatorName} has no price list in force`;
    throw new Refusal('no-price-list', `${detail}.`, [{ pointer: '/tradeAccount', detail }]);
  }
  if (!destination) {
    const detail = 'your ship-to book holds no address';
    throw new Refusal('invalid', `/shipTo: ${detail}`, [{ pointer: '/shipTo', detail }]);
  }
  return { ...rest, version, destination };
}
