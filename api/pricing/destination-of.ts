import { type Destination } from '@shared/contracts/price-lists';
import { Refusal } from '@shared/contracts/problems';
import { type Stores } from '../dependencies';

/**
 * Where goods go, for delivery and tax, on a day. Without `shipTo` the dealer's first address.
 * Exempt where the dealer has a certificate for the jurisdiction that is in force on the day.
 *
 * @throws Refusal `invalid` at `/shipTo` unless it is an address of the dealer's, or when the dealer has none
 */
export function destinationOf(
  dealerId: string,
  shipTo: string | null | undefined,
  on: string,
  { companies }: Pick<Stores, 'companies'>,
): Destination {
  const address = shipTo ? companies.addressOf(dealerId, shipTo) : companies.firstAddressOf(dealerId);
  if (!address) {
    const detail = shipTo ? 'is not an address of your ship-to book' : 'your ship-to book holds no address';
    throw new Refusal('invalid', `/shipTo: ${detail}`, [{ pointer: '/shipTo', detail }]);
  }
  const { zone, jurisdiction } = address;
  return { zone, jurisdiction, exempt: companies.certificate(dealerId, jurisdiction, on) !== undefined };
}
