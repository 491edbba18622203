import { type Destination } from '@shared/contracts/price-lists';
import { type Totals } from '@shared/contracts/prices';
import { Refusal } from '@shared/contracts/problems';
import { money } from '@shared/money/money';
import { type Dependencies } from '../dependencies';
import { checkUnits } from '../pricing/check-units';
import { totalsToWire } from '../pricing/engine/rows-to-wire';
import { totalOrder } from '../pricing/engine/total-order';
import { type QuoteLineRow, type QuoteRow } from './quote-store';

/**
 * The totals of a quote for a destination under the version and lead-time class that it holds:
 * goods are the kept line prices, while delivery and tax follow the destination. The same lines
 * and destination give the same totals for as long as the quote holds. A quote without lines
 * costs nothing.
 *
 * @throws Refusal `invalid` at `/shipTo` when the maker's list has no delivery there
 */
export function totalsOfQuote(
  quote: Pick<QuoteRow, 'priceListVersionId' | 'leadTimeClass' | 'currency'>,
  lines: readonly Pick<QuoteLineRow, 'unit' | 'quantity' | 'linePriceMinor'>[],
  destination: Destination,
  { stores, catalogue }: Pick<Dependencies, 'stores' | 'catalogue'>,
): Totals {
  const nothing = money(0, quote.currency);
  if (lines.length === 0) return { goods: nothing, orderCharges: [], tax: [], total: nothing };
  const checked = checkUnits(
    lines.map(({ unit }) => unit),
    catalogue(),
  );
  const toTotal = lines.map(({ quantity, linePriceMinor }, i) => ({ quantity, linePriceMinor, weightKg: checked[i]?.weightKg ?? null }));
  const answer = totalOrder(toTotal, stores.priceLists.version(quote.priceListVersionId), destination, quote.leadTimeClass);
  if ('refusals' in answer) {
    const errors = answer.refusals.map(({ pointer, detail }) => ({ pointer, detail }));
    throw new Refusal('invalid', `The maker does not deliver there: ${errors[0]?.detail}.`, errors);
  }
  return totalsToWire(answer.totalled);
}
