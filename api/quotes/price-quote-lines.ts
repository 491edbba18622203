import { type PriceListVersion, type PriceTerms } from '@shared/contracts/price-lists';
import { type LineInput } from '@shared/contracts/prices';
import { pointer, Refusal } from '@shared/contracts/problems';
import { makeUpText } from '@shared/glazing/make-up-text';
import { demandPossible } from '../catalogue/demand-possible';
import { type Dependencies } from '../dependencies';
import { checkUnits } from '../pricing/check-units';
import { type LineReason, priceLinesAt } from '../pricing/price-lines-at';
import { type QuoteLineRow } from './quote-store';

/** A line as it is asked for, with its place in the request. */
export type LineAsked = Pick<LineInput, 'unit' | 'quantity' | 'tag' | 'extras'> & { at: number };

/** What a quote keeps of a line but its identity and place. */
export type KeptLine = Omit<QuoteLineRow, 'id' | 'quoteId' | 'position'>;

/**
 * Prices lines for a quote under one version and terms, in their order.
 *
 * @throws Refusal `cannot-build` with the reasons when the maker cannot make or its list not price a
 *   line; `invalid` at the fields of a unit that cannot exist or an extra that the list does not have
 */
export function priceQuoteLines(
  lines: readonly LineAsked[],
  fabricatorId: string,
  { version, terms }: { version: PriceListVersion; terms: PriceTerms },
  { catalogue }: Pick<Dependencies, 'catalogue'>,
): KeptLine[] {
  const known = catalogue();
  demandPossible(
    lines.map(({ unit, at }) => ({ unit, pointer: pointer('lines', at, 'unit') })),
    known,
  );
  const maker = known.fabricators.find(({ id }) => id === fabricatorId);
  if (!maker) throw new Error(`no fabricator ${fabricatorId}`);
  const checked = checkUnits(
    lines.map(({ unit }) => unit),
    known,
  );
  const answer = priceLinesAt(lines, checked, maker, version, terms, known);
  if ('reasons' in answer) throw refusalOf(answer.reasons, lines, maker.name);
  return lines.flatMap(({ unit, quantity, tag, extras }, i) => {
    const priced = answer.lines[i];
    if (!priced) return [];
    return {
      tag: tag ?? null,
      unit,
      quantity,
      extras: extras ?? [],
      makeUp: makeUpText(unit, known),
      unitPriceMinor: priced.priced.unitPriceMinor,
      linePriceMinor: priced.priced.linePriceMinor,
      sheet: priced.sheet,
    };
  });
}

function refusalOf(reasons: readonly LineReason[], lines: readonly LineAsked[], makerName: string): Refusal {
  const ofExtra = ({ pointer: at }: LineReason) => at.startsWith('/extras/');
  const told = reasons.map((reason) => ({ ...reason, line: lines[reason.line]?.at ?? reason.line }));
  const errors = told.map((reason) => ({
    pointer: `${pointer('lines', reason.line)}${ofExtra(reason) ? '' : '/unit'}${reason.pointer}`,
    detail: reason.detail,
  }));
  if (told.every(ofExtra)) return new Refusal('invalid', `${makerName}: ${errors[0]?.detail}`, errors);
  return new Refusal('cannot-build', `${makerName}: ${errors[0]?.detail}`, errors, { reasons: told });
}
