import { type AnswerOf } from '@shared/contracts/endpoint';
import { type previewRePrice as previewRePriceEndpoint } from '@shared/contracts/quotes';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { demandNotOrdered, findQuote } from './quote-life';
import { rePrice } from './re-price';

/**
 * What a quote would cost under the list in force now: the lines whose price differs, and both
 * totals. Changes nothing.
 *
 * @throws Refusal `not-found`, `not-in-this-state` once ordered, `account-not-open`, `no-price-list` or `cannot-build`
 */
export function previewRePrice(
  actor: Member,
  { params }: Pick<Input<typeof previewRePriceEndpoint>, 'params'>,
  dependencies: Dependencies,
): AnswerOf<typeof previewRePriceEndpoint> {
  const quote = findQuote(actor, params.id, dependencies.stores);
  demandNotOrdered(quote);
  const { holding, before, after, totals } = rePrice(quote, dependencies);
  const { version } = holding;
  return {
    priceListVersion: version.version,
    priceList: { name: version.name, effectiveFrom: version.effectiveFrom },
    differences: before.flatMap((line, i) => {
      const now = after[i]?.linePriceMinor ?? line.linePriceMinor;
      if (now === line.linePriceMinor) return [];
      return [{ line: line.id, tag: line.tag, before: money(line.linePriceMinor, quote.currency), after: money(now, quote.currency) }];
    }),
    before: money(quote.totalMinor, quote.currency),
    after: totals.total,
  };
}
