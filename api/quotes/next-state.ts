import { type Destination } from '@shared/contracts/price-lists';
import { minorOf } from '@shared/money/money';
import { type Dependencies } from '../dependencies';
import { totalsOfQuote } from './price-of-quote';
import { type QuoteLineRow, type QuoteRow } from './quote-store';

/**
 * What changes of a quote with its lines, destination or version: totals and units reckoned anew,
 * and the next revision. Unit prices are the lines' own.
 */
export function nextState(
  quote: QuoteRow,
  lines: readonly Pick<QuoteLineRow, 'unit' | 'quantity' | 'linePriceMinor'>[],
  destination: Destination,
  dependencies: Pick<Dependencies, 'stores' | 'catalogue' | 'clock'>,
): Pick<QuoteRow, 'destination' | 'totals' | 'totalMinor' | 'units' | 'revision' | 'updatedAt'> {
  const totals = totalsOfQuote(quote, lines, destination, dependencies);
  return {
    destination,
    totals,
    totalMinor: minorOf(totals.total.amount, quote.currency),
    units: lines.reduce((sum, { quantity }) => sum + quantity, 0),
    revision: quote.revision + 1,
    updatedAt: dependencies.clock(),
  };
}
